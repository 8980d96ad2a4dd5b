import { type DimensionName, dimensionWords } from "#shared/domain/partKinds";
import { roundedSize, type SizeUnit } from "../lib/formatSize";

type Props = {
  name: DimensionName;
  nominalMm: number;
  lowerMm: number;
  upperMm: number;
  /** The as-new estimate, and how far it may be off (k = 2); null where only the band is known. */
  needMm: number | null;
  spreadMm?: number;
  unit: SizeUnit;
  width?: number;
  height?: number;
};

/** Where a stated size lies in the band that is accepted. Outside of it the mark is a cross, at the edge an arrow. */
export function DeviationBar(props: Props) {
  const { name, nominalMm, lowerMm, upperMm, needMm, spreadMm = 0, unit, width = 132, height = 20 } = props;
  const edge = 8;
  const bandWidth = (width - 2 * edge) * 0.64;
  const left = (width - bandWidth) / 2;
  const xOf = (mm: number) => left + ((mm - lowerMm) / (upperMm - lowerMm || 1)) * bandWidth;
  const clamp = (x: number) => Math.min(Math.max(x, edge), width - edge);
  const [top, bottom, middle] = [4, height - 4, height / 2];
  const x = xOf(nominalMm);
  const isInside = nominalMm >= lowerMm && nominalMm <= upperMm;
  const isFar = x !== clamp(x);
  const side = x < clamp(x) ? -1 : 1;
  const words = `${dimensionWords[name]} ${roundedSize(nominalMm, unit)} ${unit}: accepted from ${roundedSize(lowerMm, unit)} to ${roundedSize(upperMm, unit)}`;
  const shade = needMm !== null && spreadMm > 0 ? [clamp(xOf(needMm - spreadMm)), clamp(xOf(needMm + spreadMm))] : null;

  return (
    <svg
      width={width}
      height={height}
      viewBox={`0 0 ${width} ${height}`}
      role="img"
      aria-label={words}
      className="block"
    >
      <rect
        x={left}
        y={top}
        width={bandWidth}
        height={bottom - top}
        fill="var(--color-inband-fill)"
        stroke="var(--color-inband)"
      />
      {shade && (
        <rect
          x={shade[0]}
          y={top + 0.5}
          width={shade[1]! - shade[0]!}
          height={bottom - top - 1}
          fill="var(--color-measured)"
          opacity={0.22}
        />
      )}
      {needMm !== null && (
        <path d={`M${clamp(xOf(needMm))} ${top - 3}V${bottom + 3}`} stroke="var(--color-measured)" strokeWidth={1.8} />
      )}
      {isInside ? (
        <circle cx={x} cy={middle} r={4.2} fill="var(--color-ink)" />
      ) : (
        <path
          transform={`translate(${clamp(x)} ${middle})`}
          d={isFar ? `M${-3 * side} -4.5L${4 * side} 0L${-3 * side} 4.5` : "M-4 -4L4 4M-4 4L4 -4"}
          fill="none"
          stroke="var(--color-outband)"
          strokeWidth={2}
        />
      )}
    </svg>
  );
}
