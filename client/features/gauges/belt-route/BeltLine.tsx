import { beltOutline } from "#shared/domain/beltOutline";
import type { BeltRoute } from "#shared/domain/beltRoute";
import type { View } from "./boardView";

type Props = { route: BeltRoute; thickness: number; view: View; isStale: boolean };

/** The belt as a line of its true thickness (2 px at least); dashed where it is the last one that closed. */
export function BeltLine({ route, thickness, view, isStale }: Props) {
  const { left, top, scale } = view;
  const path = beltOutline(route.contacts);
  const width = Math.max(thickness, 2 / scale);
  const transform = `translate(${-left * scale} ${top * scale}) scale(${scale} ${-scale})`;
  if (isStale) {
    const dash = `${6 / scale} ${5 / scale}`;
    return (
      <g className="belt-line" transform={transform} opacity={0.5}>
        <path d={path} fill="none" stroke="var(--color-soft)" strokeWidth={2 / scale} strokeDasharray={dash} />
      </g>
    );
  }
  return (
    <g className="belt-line" transform={transform} fill="none" strokeLinejoin="round">
      <path d={path} stroke="var(--color-ink)" strokeWidth={width + 1.2 / scale} />
      <path d={path} stroke="var(--color-rubber)" strokeWidth={width} />
    </g>
  );
}
