/** Marks of a ruler: `count` steps from x, every fifth longer, hanging from y. */
export function Ruler({ x, y, step, count }: { x: number; y: number; step: number; count: number }) {
  const marks = Array.from({ length: count + 1 }, (_, i) => `M${x + i * step} ${y}v${i % 5 === 0 ? 8 : 5}`).join("");
  return <path d={`M${x} ${y}H${x + count * step}${marks}`} stroke="var(--color-ink)" fill="none" strokeWidth={1.1} />;
}
