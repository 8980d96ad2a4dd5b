import { Link } from "react-router-dom";
import { formatMoney } from "#shared/domain/money";
import type { BasketParcel } from "#shared/schemas/basket";
import { dispatchWords } from "../../lib/formatDate";
import type { ComparedScale } from "../../ui/drawing/comparedScale";
import { LineRow } from "../../ui/LineRow";
import { MadeToSize } from "../../ui/MadeToSize";
import { Money } from "../../ui/Money";
import { captionOf, drawnOf } from "./drawnOf";
import { KitContents } from "./KitContents";
import { ParcelHeading } from "./ParcelHeading";
import { ParcelSums } from "./ParcelSums";

type Props = { parcel: BasketParcel; label: string; currency: string; scale: ComparedScale };

/** What one workshop sells here, to be read once more before it is paid. */
export function CheckParcel({ parcel, label, currency, scale }: Props) {
  const { workshop, lines, problem } = parcel;
  return (
    <div>
      <ParcelHeading level={3} label={label} workshop={workshop} aside={dispatchWords(parcel.leavesInDays)} />
      <p>
        Sold by this workshop, not by Idlewright: <Link to={`/workshops/${workshop.slug}`}>who it is by law</Link>
      </p>
      {problem && <p className="mt-2 font-semibold text-outband">{problem}.</p>}
      <ul>
        {lines.map(({ part, ...line }) => (
          <LineRow
            key={part.id}
            level={4}
            partId={part.id}
            title={part.title}
            kind={part.kind}
            dims={part.dimensions}
            drawn={drawnOf(part)}
            caption={captionOf(part)}
            material={part.material ?? undefined}
            forNeed={line.forNeed}
            scale={scale}
            notes={
              <>
                {part.kind === "rebuild-kit" && <KitContents lines={part.kitLines} />}
                {line.madeToSize && <MadeToSize />}
                {line.problem && <p className="font-semibold text-outband">{line.problem}</p>}
              </>
            }
            quantity={
              <p>
                {line.quantity} × {formatMoney(line.unitMinor, part.currency)}
              </p>
            }
            price={
              <p className="text-step1 font-bold">
                <Money minor={line.lineMinor} currency={part.currency} />
              </p>
            }
          />
        ))}
      </ul>
      <ParcelSums parcel={parcel} currency={currency} label="This parcel" />
    </div>
  );
}
