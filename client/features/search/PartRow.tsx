import { Link } from "react-router-dom";
import { formatMoney } from "#shared/domain/money";
import type { Need } from "#shared/schemas/need";
import type { SearchItem } from "#shared/schemas/search";
import { capitalised } from "../../lib/capitalised";
import type { SizeUnit } from "../../lib/formatSize";
import { needWords } from "../../lib/needWords";
import { PartDrawing } from "../../ui/drawing/PartDrawing";
import { Money } from "../../ui/Money";
import { materialWords, readyWords, toCountry } from "../../ui/offerWords";
import { PutInBasket } from "../../ui/PutInBasket";
import { SizeTable } from "../../ui/SizeTable";
import { VerdictMark } from "../../ui/VerdictMark";
import { drawnOf, type RowScale, rowDrawing } from "./drawnOf";
import type { FromResults } from "./StripBar";

type Props = {
  item: SearchItem;
  need: Need;
  /** The need as it stands in the address, for the part's page. */
  needQuery: string;
  unit: SizeUnit;
  scale: RowScale | undefined;
  isLit?: boolean;
  onLight?: (partId: string | null) => void;
  /** The way back from the part’s page. */
  from: FromResults;
  /** The one size that fails, in place of the fit's own reason. */
  failing?: string;
};

export const rowId = (partId: string): string => `part-${partId}`;

function Price({ item, need }: { item: SearchItem; need: Need }) {
  const { part, landedMinor, shippingMinor, currency } = item;
  const to = toCountry(need.shipTo);
  if (landedMinor === null || shippingMinor === null) {
    return (
      <>
        <p className="text-step2 font-bold">
          <Money minor={part.priceMinor} currency={part.currency} />
        </p>
        <p className="text-small text-soft">This workshop does not post {to}</p>
      </>
    );
  }
  const postage = part.offerType === "re-mould" ? "postage, and yours for the core" : "postage";
  return (
    <>
      <p className="text-step2 font-bold">
        <Money minor={landedMinor} currency={currency} />
      </p>
      <p className="text-small text-soft">
        {to}: {formatMoney(part.priceMinor, part.currency)} + {formatMoney(shippingMinor, currency)} {postage}
      </p>
    </>
  );
}

/** One part as a row: drawn to scale, what it is and how surely it fits, its sizes, what it costs delivered. */
export function PartRow({ item, need, needQuery, unit, scale, isLit, onLight, from, failing }: Props) {
  const { part, workshop, fit, kitLineId, evidence } = item;
  const drawn = drawnOf(item);
  const kitLine = part.kitLines.find(({ id }) => id === kitLineId);
  const asFound = Object.fromEntries(
    need.dimensions.flatMap(({ dimension, asFoundMm }) => (asFoundMm === null ? [] : [[dimension, asFoundMm]])),
  );
  const material = materialWords(part);
  return (
    <li
      id={rowId(part.id)}
      tabIndex={-1}
      className="part-row"
      data-lit={isLit || undefined}
      onPointerEnter={() => onLight?.(part.id)}
      onPointerLeave={() => onLight?.(null)}
      onFocus={() => onLight?.(part.id)}
      onBlur={() => onLight?.(null)}
    >
      <div style={{ gridArea: "drawing" }} className="row-drawing">
        {drawn && (
          <PartDrawing
            view="row"
            kind={drawn.kind}
            dims={drawn.dims}
            asFound={drawn.kind === need.kind ? asFound : undefined}
            unit={unit}
            material={part.material ?? undefined}
            {...rowDrawing}
            {...scale}
          />
        )}
      </div>
      <div style={{ gridArea: "words" }} className="grid content-start gap-1">
        <h3 className="text-step1">
          <Link to={`/parts/${part.id}?${needQuery}`} state={from} className="no-underline hover:underline">
            {part.title}
          </Link>
        </h3>
        <p className="text-soft">
          <Link to={`/workshops/${workshop.slug}`} className="text-ink no-underline hover:underline">
            {workshop.name}
          </Link>
          , {workshop.town}, {workshop.countryName}
          {material && <span className="block">{material}</span>}
        </p>
        {kitLine && (
          <p>
            Its {kitLine.title.toLowerCase()} is the line that fits; {part.kitLines.length} lines in the kit.
          </p>
        )}
        {fit && (
          <p className="mt-1 max-w-prose">
            <VerdictMark verdict={fit.verdict} chance={fit.chance} />{" "}
            <span className="ml-1">{failing ?? fit.reason}</span>
          </p>
        )}
        <p className="mt-1 text-soft">{capitalised(evidence.sentence)}</p>
      </div>
      {drawn && (
        <div style={{ gridArea: "sizes" }} className="grid content-start gap-1">
          <SizeTable
            kind={drawn.kind}
            stated={drawn.dims}
            fits={fit?.dimensions ?? []}
            needs={need.dimensions}
            unit={unit}
          />
          {fit && (
            <p className="text-small text-soft">
              {fit.checked} of {fit.matters} sizes checked
            </p>
          )}
        </div>
      )}
      <div style={{ gridArea: "price" }} className="grid content-start gap-0.5">
        <Price item={item} need={need} />
        <p className="mb-2 text-soft">{readyWords(part)}</p>
        <PutInBasket part={part} forNeed={needWords(need)} />
      </div>
    </li>
  );
}
