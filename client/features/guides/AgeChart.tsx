import { conditionFacts } from "#shared/domain/conditions";
import type { DimensionName, PartKind } from "#shared/domain/partKinds";
import { capitalised } from "../../lib/capitalised";
import { useOwnWidth } from "../../ui/drawing/useOwnWidth";
import { type AgeRow, ageRows } from "./ageRows";
import { changeWords } from "./changeWords";
import { niceStep } from "./niceStep";

type Props = { kind: PartKind; dimension: DimensionName; sizeMm: number };

/** What each condition does to one size: its bar as found and as new, the ends drawn to one magnified scale. */
export function AgeChart({ kind, dimension, sizeMm }: Props) {
  const [place, width] = useOwnWidth(640);
  const rows = ageRows(kind, dimension, sizeMm);
  const reach = Math.max(...rows.map(({ correctionMm, spreadMm }) => Math.abs(correctionMm) + spreadMm)) * 1.05;
  const arm = width / 2 - 44;
  const xOf = (mm: number) => width / 2 + (mm / reach) * arm;
  // Labels stand at least 48 px apart, and not more than a few to a side.
  const step = niceStep(reach * Math.max(48 / arm, 0.28));
  const count = Math.floor(reach / step);
  const ticks = Array.from({ length: 2 * count + 1 }, (_, i) => (i - count) * step);
  return (
    <div className="border border-rule bg-sheet px-3 py-3 print:break-inside-avoid">
      <div ref={place}>
        <ul className="grid gap-2.5">
          {rows.map((row) => (
            <li key={row.condition}>
              <p className="flex flex-wrap justify-between gap-x-4">
                <span className="font-semibold">{capitalised(conditionFacts[row.condition].name)}</span>
                <span className={row.spreadMm > 0 ? "text-measured" : "text-soft"}>{changeWords(row, sizeMm)}</span>
              </p>
              <Bars row={row} width={width} xOf={xOf} />
            </li>
          ))}
        </ul>
        <svg width={width} height="34" viewBox={`0 0 ${width} 34`} className="block" aria-hidden="true">
          <path
            d={`M${xOf(-reach)} 4H${xOf(reach)}${ticks.map((mm) => `M${xOf(mm)} 4v6`).join("")}`}
            fill="none"
            stroke="var(--color-ink)"
          />
          {ticks.map((mm) => (
            <text key={mm} x={xOf(mm)} y="25" textAnchor="middle" fontSize="13" fill="var(--color-soft)">
              {signed(mm, step)}
            </text>
          ))}
        </svg>
        <p className="text-small text-soft">
          Millimetres more or less than found, on {sizeMm} mm. Above: as found; below: as new, with the range that it
          lies in (k = 2).
        </p>
      </div>
    </div>
  );
}

function signed(mm: number, step: number): string {
  const decimals = step < 0.1 ? 2 : step < 1 ? 1 : 0;
  const text = Math.abs(mm).toFixed(decimals);
  if (Math.abs(mm) < step / 2) return "0";
  return `${mm < 0 ? "−" : "+"}${text}`;
}

function Bars({ row, width, xOf }: { row: AgeRow; width: number; xOf: (mm: number) => number }) {
  const { correctionMm, spreadMm } = row;
  const [found, asNew, low, high] = [
    xOf(0),
    xOf(correctionMm),
    xOf(correctionMm - spreadMm),
    xOf(correctionMm + spreadMm),
  ];
  const cut = 24;
  return (
    <svg width={width} height="30" viewBox={`0 0 ${width} 30`} className="block" aria-hidden="true">
      <rect x="0.5" y="2" width={found} height="10" fill="var(--color-rubber)" stroke="var(--color-ink)" />
      <rect x="0.5" y="16" width={asNew} height="10" fill="var(--color-measured-fill)" stroke="var(--color-measured)" />
      <path d={`M${cut} 30l6 -30h5l-6 30Z`} fill="var(--color-sheet)" />
      <path d={`M${found} 0V30`} stroke="var(--color-soft)" strokeDasharray="3 2" />
      {spreadMm > 0 && (
        <path d={`M${low} 21H${high}M${low} 16V26M${high} 16V26`} stroke="var(--color-measured)" strokeWidth="1.8" />
      )}
    </svg>
  );
}
