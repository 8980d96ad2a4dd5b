import { type KeyboardEvent, type PointerEvent, useRef } from "react";
import type { Range } from "../../lib/axisMarks";
import { roundedSize, type SizeUnit } from "../../lib/formatSize";

type Props = {
  valueMm: number;
  range: Range;
  unit: SizeUnit;
  x: number;
  /** Where the marker’s point lies, and where the rail’s axis does, px from its top. */
  top: number;
  height: number;
  toMm: (clientX: number) => number;
  onMove: (mm: number) => void;
};

const steps: Record<SizeUnit, number> = { mm: 0.05, in: 0.002 * 25.4 };

/** The as-new estimate as a marker to drag, or to move with the arrow keys: a step of 0.05 mm, ten with shift. */
export function RailSlider({ valueMm, range, unit, x, top, height, toMm, onMove }: Props) {
  const isHeld = useRef(false);
  const step = steps[unit];
  const rounded = (mm: number) => Math.min(Math.max(Math.round(mm / step) * step, range.fromMm), range.toMm);

  const onKeyDown = (event: KeyboardEvent) => {
    const by = step * (event.shiftKey ? 10 : 1);
    const moves: Record<string, number> = {
      ArrowLeft: valueMm - by,
      ArrowDown: valueMm - by,
      ArrowRight: valueMm + by,
      ArrowUp: valueMm + by,
      PageDown: valueMm - 10 * step,
      PageUp: valueMm + 10 * step,
      Home: range.fromMm,
      End: range.toMm,
    };
    const to = moves[event.key];
    if (to === undefined) return;
    event.preventDefault();
    onMove(Math.max(to, step));
  };
  const onPointerMove = (event: PointerEvent) => {
    if (isHeld.current) onMove(rounded(toMm(event.clientX)));
  };
  const release = () => {
    isHeld.current = false;
  };

  return (
    <div
      role="slider"
      tabIndex={0}
      aria-label="As-new size on the rail"
      aria-valuemin={Number(range.fromMm.toFixed(2))}
      aria-valuemax={Number(range.toMm.toFixed(2))}
      aria-valuenow={Number(valueMm.toFixed(2))}
      aria-valuetext={`${roundedSize(valueMm, unit)} ${unit}`}
      className="rail-slider"
      style={{ left: x, height }}
      onKeyDown={onKeyDown}
      onPointerDown={(event) => {
        isHeld.current = true;
        event.currentTarget.setPointerCapture?.(event.pointerId);
      }}
      onPointerMove={onPointerMove}
      onPointerUp={release}
      onPointerCancel={release}
    >
      <svg width={44} height={height} viewBox={`-22 0 44 ${height}`} aria-hidden="true">
        <path d={`M0 ${top}V${height}`} stroke="var(--color-measured)" strokeWidth={2} />
        <path d={`M-6.5 ${top - 10}H6.5V${top - 3}L0 ${top + 4}L-6.5 ${top - 3}Z`} fill="var(--color-measured)" />
      </svg>
    </div>
  );
}
