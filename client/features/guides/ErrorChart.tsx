import { type Instrument, instrumentFacts, instruments } from "#shared/domain/instruments";
import { permissibleError } from "#shared/domain/permissibleError";
import { capitalised } from "../../lib/capitalised";
import { useOwnWidth } from "../../ui/drawing/useOwnWidth";

const decades = [0.001, 0.01, 0.1, 1, 10];
const rowHeight = 46;

/** How far each instrument may be off, from the smallest of these sizes to the largest, on a scale of tenfold steps. */
export function ErrorChart({ sizesMm }: { sizesMm: readonly number[] }) {
  const [place, width] = useOwnWidth(640);
  const xOf = (mm: number) => 12 + ((Math.log10(mm) + 3) / 4) * (width - 32);
  const height = instruments.length * rowHeight + 30;
  const base = height - 26;
  const errorsOf = (instrument: Instrument) => sizesMm.map((size) => permissibleError(instrument, size).plusMinusMm);
  return (
    <div ref={place} className="max-w-3xl border border-rule bg-sheet print:break-inside-avoid">
      <svg
        width={width}
        height={height}
        viewBox={`0 0 ${width} ${height}`}
        className="block max-w-full"
        role="img"
        aria-label="How far each instrument may be off, on a scale of tenfold steps; the table below has the figures"
        fontSize="13"
      >
        <path
          d={`${decades.map((mm) => `M${xOf(mm)} 8V${base + 6}`).join("")}M${xOf(0.001)} ${base}H${xOf(10)}`}
          stroke="var(--color-rule)"
        />
        {instruments.map((instrument, at) => {
          const errors = errorsOf(instrument);
          const y = at * rowHeight + 36;
          const [least, most] = [Math.min(...errors), Math.max(...errors)];
          const isRight = xOf(most) > width * 0.6;
          return (
            <g key={instrument}>
              <path d={`M${xOf(least)} ${y}H${xOf(most)}`} stroke="var(--color-measured)" strokeWidth="4" />
              {[...new Set(errors)].map((error) => (
                <circle key={error} cx={xOf(error)} cy={y} r="4.5" fill="var(--color-measured)" />
              ))}
              <text
                x={isRight ? xOf(most) + 5 : xOf(least) - 5}
                y={y - 10}
                textAnchor={isRight ? "end" : "start"}
                fontSize="14"
                fill="var(--color-ink)"
              >
                {capitalised(instrumentFacts[instrument].name)}
              </text>
            </g>
          );
        })}
        <g fill="var(--color-soft)" textAnchor="middle">
          {decades.map((mm) => (
            <text key={mm} x={xOf(mm)} y={base + 20} textAnchor={mm === 10 ? "end" : mm === 0.001 ? "start" : "middle"}>
              {mm === 10 ? "10 mm" : mm}
            </text>
          ))}
        </g>
      </svg>
    </div>
  );
}
