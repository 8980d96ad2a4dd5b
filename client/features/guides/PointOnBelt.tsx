/** The point of a hardness gauge on a thin belt, to scale: it would stand deeper than the belt is thick. */
export function PointOnBelt({ depthMm, thicknessMm }: { depthMm: number; thicknessMm: number }) {
  const px = 44;
  const table = 132;
  const top = table - thicknessMm * px;
  const tip = top + depthMm * px;
  return (
    <svg
      viewBox="0 0 320 190"
      className="h-auto w-full max-w-md border border-rule bg-sheet"
      role="img"
      aria-label={`The point of a hardness gauge would stand ${depthMm.toFixed(1)} mm deep in a belt of ${thicknessMm} mm`}
      fontSize="15"
      fontWeight="600"
      fill="var(--color-measured)"
    >
      <rect x="48" y={top} width="252" height={table - top} fill="var(--color-rubber)" stroke="var(--color-ink)" />
      <rect x="48" y={table} width="252" height="44" fill="var(--color-metal-fill)" stroke="var(--color-metal)" />
      <path
        d={`M100 20H220V${top}H188V${top}L165 ${tip}H155L132 ${top}H100Z`}
        fill="var(--color-ground)"
        stroke="var(--color-ink)"
        strokeWidth="1.4"
      />
      <path
        d={`M165 ${tip}H262M246 ${top}V${tip}M246 ${top}l-3.5 8h7ZM246 ${tip}l-3.5 -8h7Z`}
        fill="var(--color-measured)"
        stroke="var(--color-measured)"
      />
      <text x="240" y={top - 8}>
        {depthMm.toFixed(1)} mm
      </text>
      <path
        d={`M46 ${top}H24M46 ${table}H24M30 ${top}V${table}M30 ${top}l-3.5 8h7ZM30 ${table}l-3.5 -8h7Z`}
        fill="var(--color-ink)"
        stroke="var(--color-ink)"
      />
      <text x="22" y={top - 8} fill="var(--color-ink)">
        {thicknessMm} mm
      </text>
    </svg>
  );
}
