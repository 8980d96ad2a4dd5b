import type { KeyboardEvent, PointerEvent } from "react";
import { beltRouteLimits } from "#shared/domain/beltRoute";
import type { NamedPulley } from "./beltState";
import { toPx, type View } from "./boardView";
import { keyStep } from "./keyStep";
import { rimHandleBox } from "./rimHandleBox";

type Props = {
  pulley: NamedPulley;
  view: View;
  name: string;
  onHold: (event: PointerEvent<Element>, id: number) => void;
  onDiameter: (id: number, diameter: number) => void;
};

/** On the right of the chosen pulley: its diameter, to be dragged wider or set with the arrow keys. */
export function RimHandle({ pulley, view, name, onHold, onDiameter }: Props) {
  const { id, diameter } = pulley;
  const box = rimHandleBox(toPx(view, pulley), (diameter / 2) * view.scale);
  const onKeyDown = (event: KeyboardEvent) => {
    const sign = { ArrowUp: 1, ArrowRight: 1, ArrowDown: -1, ArrowLeft: -1 }[event.key];
    if (!sign) return;
    event.preventDefault();
    onDiameter(id, diameter + sign * keyStep(event));
  };
  return (
    <div
      role="slider"
      tabIndex={0}
      aria-label={`Diameter of ${name}`}
      aria-valuemin={beltRouteLimits.diameter[0]}
      aria-valuemax={beltRouteLimits.diameter[1]}
      aria-valuenow={diameter}
      aria-valuetext={`${diameter} mm`}
      className="belt-rim"
      style={{ transform: `translate(${box.x - box.width / 2}px, ${box.y - box.height / 2}px)` }}
      onPointerDown={(event) => onHold(event, id)}
      onKeyDown={onKeyDown}
    >
      <svg width={box.width} height={box.height} viewBox="-16 -22 36 44" aria-hidden="true">
        <path d="M-16 0H-9" stroke="var(--color-measured)" strokeWidth={1.5} />
        <path d="M-9 0L-3 -6V6ZM9 0L3 -6V6Z" fill="var(--color-measured)" />
      </svg>
    </div>
  );
}
