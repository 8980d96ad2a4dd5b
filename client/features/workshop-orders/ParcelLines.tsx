import { useMemo } from "react";
import { formatMoney } from "#shared/domain/money";
import type { WorkshopParcel, WorkshopParcelLine } from "#shared/schemas/workshopParcel";
import { useUnit } from "../../lib/preferences";
import { comparedScale, type Drawable } from "../../ui/drawing/comparedScale";
import { ScaleBar } from "../../ui/drawing/ScaleBar";
import { LineRow } from "../../ui/LineRow";
import { Money } from "../../ui/Money";
import { materialWords, offerNames } from "../../ui/offerWords";
import { RuledHeading } from "../../ui/RuledHeading";

const drawnKitLine = ({ kitLines }: WorkshopParcelLine) => kitLines.find(({ kind }) => kind !== null);

/** What is drawn of a line: the part, or the first measured one of a kit. */
function drawnOf(line: WorkshopParcelLine): Drawable | null {
  if (line.kind !== "rebuild-kit") return { kind: line.kind, dims: line.dimensions };
  const first = drawnKitLine(line);
  return first?.kind ? { kind: first.kind, dims: first.dimensions } : null;
}

function LineNotes({ line }: { line: WorkshopParcelLine }) {
  const { kitLines, madeToSize, offerType } = line;
  const made = [offerNames[offerType], materialWords(line)].filter(Boolean).join("; ");
  return (
    <>
      <p className="text-soft">{made}</p>
      {kitLines.length > 0 && (
        <p className="text-soft">
          Holds {kitLines.map(({ quantity, title }) => (quantity > 1 ? `${quantity} × ${title}` : title)).join(", ")}
        </p>
      )}
      {madeToSize && <p>Made to the buyer’s size</p>}
    </>
  );
}

/** What to make and pack: each part drawn at one scale, with the sizes that were stated when it was bought. */
export function ParcelLines({ parcel: { lines, currency } }: { parcel: WorkshopParcel }) {
  const unit = useUnit();
  const scale = useMemo(() => comparedScale(lines.flatMap((line) => drawnOf(line) ?? [])), [lines]);
  return (
    <section className="grid gap-4">
      <RuledHeading>To make and pack</RuledHeading>
      <ScaleBar pxPerMm={scale.pxPerMm} unit={unit} />
      <ul>
        {lines.map((line) => (
          <LineRow
            key={line.id}
            partId={line.partId}
            title={line.title}
            kind={line.kind}
            dims={line.dimensions}
            drawn={drawnOf(line)}
            caption={line.kind === "rebuild-kit" ? drawnKitLine(line)?.title : undefined}
            material={line.material ?? undefined}
            forNeed={line.forNeed}
            scale={scale}
            notes={<LineNotes line={line} />}
            quantity={
              <p>
                <span className="text-step1 font-bold">{line.quantity}</span> × {formatMoney(line.unitMinor, currency)}
              </p>
            }
            price={<Money minor={line.lineMinor} currency={currency} />}
          />
        ))}
      </ul>
    </section>
  );
}
