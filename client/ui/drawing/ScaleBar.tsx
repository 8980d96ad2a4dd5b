import type { SizeUnit } from "../../lib/formatSize";

const lengths = { mm: [5, 10, 20, 50, 100, 200], in: [12.7, 25.4, 50.8, 127, 254] } as const;
const words = (mm: number, unit: SizeUnit) => (unit === "mm" ? `${mm} mm` : `${mm / 25.4} in`);

/** How long a round length is in the drawings of this page; nothing where nothing is drawn (a scale of 0). */
export function ScaleBar({ pxPerMm, unit }: { pxPerMm: number; unit: SizeUnit }) {
  if (pxPerMm === 0) return null;
  const mm = lengths[unit].find((length) => length * pxPerMm >= 32) ?? lengths[unit][0];
  const width = mm * pxPerMm;
  return (
    <p className="flex items-center gap-2 text-small text-soft">
      <svg width={width + 2} height="10" viewBox={`-1 0 ${width + 2} 10`} aria-hidden="true">
        <path d={`M0 1V9M0 5H${width}M${width} 1V9`} fill="none" stroke="currentColor" />
      </svg>
      {words(mm, unit)}: all drawn at one scale
    </p>
  );
}
