type Props = { id: string };

/** Rubber and metal as they are cut, hatched in opposite directions (ISO 128-3), as `url(#id-rubber)` and `url(#id-metal)`. */
export function Hatches({ id }: Props) {
  return (
    <defs>
      {(["rubber", "metal"] as const).map((material) => (
        <pattern
          key={material}
          id={`${id}-${material}`}
          width={6}
          height={6}
          patternUnits="userSpaceOnUse"
          patternTransform={`rotate(${material === "rubber" ? 45 : -45})`}
        >
          <rect width={6} height={6} fill={`var(--color-${material === "rubber" ? "rubber" : "metal-fill"})`} />
          <path
            d="M0 0V6"
            stroke={`var(--color-${material === "rubber" ? "rubber-hatch" : "metal"})`}
            strokeWidth={1.1}
          />
        </pattern>
      ))}
    </defs>
  );
}
