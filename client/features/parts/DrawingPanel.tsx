import { Link, useSearchParams } from "react-router-dom";
import type { PartPage } from "#shared/schemas/catalogue";
import { roundedSize, type SizeUnit } from "../../lib/formatSize";
import { keepUnit } from "../../lib/preferences";
import { withUnit } from "../../lib/withUnit";
import { DimensionLabel } from "../../ui/DimensionLabel";
import { KitDrawing } from "../../ui/drawing/KitDrawing";
import { PartDrawing } from "../../ui/drawing/PartDrawing";
import { RuledHeading } from "../../ui/RuledHeading";

type Props = { page: PartPage; unit: SizeUnit };

/** The part drawn from its numbers, the user's own laid over it dashed; photos come second. */
export function DrawingPanel({ page, unit }: Props) {
  const { part, need } = page;
  const [params] = useSearchParams();
  const found = need.dimensions.filter(({ asFoundMm }) => asFoundMm !== null);
  const asFound = Object.fromEntries(found.map(({ dimension, asFoundMm }) => [dimension, asFoundMm ?? 0]));
  const lines = part.kitLines.map(({ title, quantity, kind, dimensions, servicePointName }) => ({
    label: servicePointName ?? title,
    quantity,
    kind: kind ?? undefined,
    dims: dimensions,
    asFound: kind !== null && kind === need.kind ? asFound : undefined,
  }));
  return (
    <section style={{ gridArea: "drawing" }} className="grid grid-cols-[minmax(0,1fr)] content-start gap-2">
      <RuledHeading className="mt-6">{`Drawn from its numbers, ${unit === "mm" ? "millimetres" : "inches"}`}</RuledHeading>
      <div className="overflow-hidden border border-rule bg-sheet">
        {part.kind === "rebuild-kit" ? (
          <KitDrawing lines={lines} unit={unit} />
        ) : (
          <PartDrawing
            view="large"
            kind={part.kind}
            dims={part.dimensions}
            asFound={part.kind === need.kind ? asFound : undefined}
            unit={unit}
            material={part.material ?? undefined}
          />
        )}
      </div>
      <div className="flex flex-wrap items-center gap-x-6 gap-y-1 print:hidden">
        <nav aria-label="Unit" className="flex gap-x-2">
          {(["mm", "in"] as const).map((one) => (
            <Link
              key={one}
              to={`?${withUnit(params, unit, one)}`}
              replace
              aria-current={one === unit ? "true" : undefined}
              onClick={() => keepUnit(one)}
              className="inline-flex min-h-8 min-w-8 items-center justify-center no-underline hover:underline aria-[current]:font-bold"
            >
              {one}
            </Link>
          ))}
        </nav>
        {found.length > 0 && (
          <p className="text-soft">
            Dashed blue: yours as found,{" "}
            {found.map(({ dimension, asFoundMm }, i) => (
              <span key={dimension}>
                {i > 0 && ", "}
                <DimensionLabel name={dimension} /> {roundedSize(asFoundMm ?? 0, unit)}
              </span>
            ))}
          </p>
        )}
      </div>
    </section>
  );
}
