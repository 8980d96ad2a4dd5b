import { roundDecimal } from "#shared/domain/roundDecimal";

/** One belt when new, and found after little and after much set; only the ends are drawn, magnified. */
export function SetRange({ relaxedMm, lengthsMm }: { relaxedMm: number; lengthsMm: readonly number[] }) {
  const bars = [
    { name: "when new", mm: relaxedMm, isNew: true },
    ...lengthsMm.map((mm) => ({ name: "found", mm, isNew: false })),
  ];
  const most = Math.max(...lengthsMm);
  const endOf = (mm: number) => 120 + ((mm - relaxedMm) / (most - relaxedMm)) * 90;
  return (
    <svg
      viewBox="0 0 320 118"
      className="h-auto w-full max-w-md border border-rule bg-sheet"
      role="img"
      aria-label={`A belt of ${relaxedMm} mm found with ${lengthsMm.map((mm) => roundDecimal(mm, 1)).join(" or ")} mm`}
      fontSize="14"
      fill="var(--color-ink)"
    >
      {bars.map(({ name, mm, isNew }, at) => (
        <g key={mm}>
          <rect
            x="12"
            y={14 + at * 34}
            width={endOf(mm) - 12}
            height="18"
            fill={isNew ? "var(--color-measured-fill)" : "var(--color-rubber)"}
            stroke={isNew ? "var(--color-measured)" : "var(--color-ink)"}
          />
          <text x={endOf(mm) + 8} y={28 + at * 34}>
            {name} {roundDecimal(mm, 1)}
          </text>
        </g>
      ))}
      <path d="M44 118l8 -118h7l-8 118Z" fill="var(--color-sheet)" />
    </svg>
  );
}
