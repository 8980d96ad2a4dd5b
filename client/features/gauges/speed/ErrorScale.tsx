import { isWithinLimit, type SpeedError } from "#shared/domain/speedError";
import type { SpeedLimit } from "#shared/domain/speedLimits";
import { axisMarks } from "../../../lib/axisMarks";
import { useOwnWidth } from "../../../ui/drawing/useOwnWidth";
import { RuledHeading } from "../../../ui/RuledHeading";
import { signed } from "./errorWords";
import { centMarks, limitsOf, rangeFor } from "./scaleMarks";

type Props = { error: SpeedError; medium: SpeedLimit["medium"] };

/** How far the speed is off, on a ruler with zero in its middle, and the published limits under it. */
export function ErrorScale({ error, medium }: Props) {
  const [place, width] = useOwnWidth(320);
  const limits = limitsOf(medium);
  const range = rangeFor(error.errorPercent, limits);
  const xOf = (percent: number) => width / 2 + (percent / range) * (width / 2 - 22);
  const x = Math.min(Math.max(xOf(error.errorPercent), 5), width - 5);
  return (
    <section className="grid min-w-0 grid-cols-[minmax(0,1fr)] gap-3">
      <RuledHeading>Error and published limits</RuledHeading>
      <div ref={place} className="grid min-w-0 grid-cols-[minmax(0,1fr)] gap-3">
        <div>
          <Ruler error={error} range={range} width={width} xOf={xOf} x={x} />
          <p className="text-small text-soft">Percent above, cents below.</p>
        </div>
        <ul className="grid gap-3">
          {limits.map((limit) => (
            <LimitRow key={limit.name} limit={limit} error={error} width={width} xOf={xOf} x={x} />
          ))}
        </ul>
      </div>
      <p className="text-small text-soft">
        Limits of the mean speed, ends included. Look up what is at second hand or from memory before you rely on it. A
        cent is a hundredth of a semitone.
      </p>
    </section>
  );
}

type Placed = { width: number; xOf: (percent: number) => number; x: number; error: SpeedError };

function Ruler({ error, range, width, xOf, x }: Placed & { range: number }) {
  const words = `${signed(error.errorPercent)} %, ${signed(error.errorCents, 1)} cents`;
  const [percentY, centsY] = [30, 52];
  return (
    <svg
      width={width}
      height={84}
      viewBox={`0 0 ${width} 84`}
      role="img"
      aria-label={words}
      className="block max-w-full"
    >
      <path d={`M0 ${percentY}H${width}M0 ${centsY}H${width}`} stroke="var(--color-ink)" />
      {axisMarks({ fromMm: -range, toMm: range }, width - 44, "mm", 48)
        .filter(({ mm }) => mm >= -100)
        .map(({ mm, label }) => (
          <g key={mm}>
            <path d={`M${xOf(mm)} ${percentY}v${label ? -9 : -5}`} stroke="var(--color-ink)" />
            {label && (
              <text x={xOf(mm)} y={percentY - 13} {...figures}>
                {signed(mm, label.split(".")[1]?.length ?? 0)}
              </text>
            )}
          </g>
        ))}
      {centMarks(range, width).map(({ cents, percent }) => (
        <g key={cents}>
          <path d={`M${xOf(percent)} ${centsY}v9`} stroke="var(--color-ink)" />
          <text x={xOf(percent)} y={centsY + 22} {...figures}>
            {signed(cents, 0)}
          </text>
        </g>
      ))}
      <rect x={0} y={percentY + 1} width={width} height={centsY - percentY - 2} fill="var(--color-sheet)" />
      <path d={`M${xOf(0)} ${percentY - 9}V${centsY + 9}`} stroke="var(--color-ink)" strokeWidth={1.5} />
      <path d={`M${x} ${percentY + 1}V${84}`} stroke="var(--color-measured)" strokeWidth={2.5} />
      <path d={`M${x} ${percentY + 1}l-5.5 9h11Z`} fill="var(--color-measured)" />
    </svg>
  );
}

const figures = { fontSize: 12, textAnchor: "middle", fill: "var(--color-soft)" } as const;

function LimitRow({ limit, error, width, xOf, x }: Placed & { limit: SpeedLimit }) {
  const { name, use, lowerPercent, upperPercent, source, status } = limit;
  const keeps = isWithinLimit(error.errorPercent, limit);
  const band =
    lowerPercent === -upperPercent
      ? `±${upperPercent} %`
      : `${signed(lowerPercent, 1)} to ${signed(upperPercent, 1)} %`;
  const [from, to] = [xOf(lowerPercent), xOf(upperPercent)];
  return (
    <li className="grid gap-1">
      <svg width={width} height={18} viewBox={`0 0 ${width} 18`} aria-hidden="true" className="block max-w-full">
        <path d={`M0 9H${width}`} stroke="var(--color-rule)" />
        <rect
          x={from}
          y={2}
          width={to - from}
          height={14}
          fill="var(--color-inband-fill)"
          stroke="var(--color-inband)"
        />
        <path d={`M${xOf(0)} 0V18`} stroke="var(--color-ink)" strokeWidth={0.8} />
        {keeps ? (
          <circle cx={x} cy={9} r={4.5} fill="var(--color-measured)" />
        ) : (
          <path d={`M${x - 4.5} 4.5l9 9M${x - 4.5} 13.5l9 -9`} stroke="var(--color-outband)" strokeWidth={2.2} />
        )}
      </svg>
      <p className="leading-snug">
        <strong className="font-semibold">{name}</strong> {band}
        {use === "recording" && " (for recording)"}:{" "}
        <span className={`font-semibold ${keeps ? "text-inband" : "text-outband"}`}>{keeps ? "kept" : "outside"}</span>
        <br />
        <small className="text-soft">
          {source}. {statusWords[status]}
        </small>
      </p>
    </li>
  );
}

const statusWords: Record<SpeedLimit["status"], string> = {
  "seen in print": "Seen in print.",
  secondary: "At second hand.",
  "from memory": "From memory, not looked up.",
};
