import { type PointerEvent, type RefObject, useEffect, useRef, useState } from "react";
import { flushSync } from "react-dom";
import type { NamedPulley } from "./beltState";

type Change = { x: number; y: number } | { diameter: number };
type Grip = { id: number; isRim: boolean; fromX: number; fromY: number; pulley: NamedPulley; scale: number };

/** What a px is worth decides how finely a drag sets, mm. */
const stepOf = (scale: number) => (scale >= 8 ? 0.1 : scale >= 1.2 ? 0.5 : scale >= 0.3 ? 1 : 5);

/**
 * Dragging of pulleys (`hold`) and of their rims (`holdRim`), by mouse, pen or finger. However many events come, what was
 * dragged last is set once in each frame and drawn in it.
 */
export function usePulleyDrag(
  pulleys: readonly NamedPulley[],
  /** Px for each mm, as the board is drawn. */
  scale: RefObject<number>,
  onDrag: (id: number, change: Change) => void,
) {
  const [isHeld, setHeld] = useState(false);
  const grip = useRef<Grip | null>(null);
  const next = useRef<Change | null>(null);
  const frame = useRef(0);
  const latest = useRef({ pulleys, onDrag });
  latest.current = { pulleys, onDrag };

  const set = () => {
    frame.current = 0;
    const [held, change] = [grip.current, next.current];
    next.current = null;
    if (held && change) flushSync(() => latest.current.onDrag(held.id, change));
  };
  useEffect(() => () => cancelAnimationFrame(frame.current), []);

  const begin = (event: PointerEvent<Element>, id: number, isRim: boolean) => {
    const pulley = latest.current.pulleys.find((one) => one.id === id);
    if (!pulley || event.button !== 0 || grip.current) return;
    event.currentTarget.setPointerCapture?.(event.pointerId);
    grip.current = { id, isRim, fromX: event.clientX, fromY: event.clientY, pulley, scale: scale.current };
    setHeld(true);
  };

  /** For the board, which hears what the captured pulley does. */
  const handlers = {
    onPointerMove: (event: PointerEvent) => {
      const held = grip.current;
      if (!held) return;
      const [dx, dy] = [event.clientX - held.fromX, event.clientY - held.fromY];
      const step = stepOf(held.scale);
      const stepped = (mm: number) => Math.round(mm / step) * step;
      const { x, y, diameter } = held.pulley;
      next.current = held.isRim
        ? { diameter: Math.max(step, stepped(diameter + (2 * dx) / held.scale)) }
        : { x: stepped(x + dx / held.scale), y: stepped(y - dy / held.scale) };
      frame.current ||= requestAnimationFrame(set);
    },
    onPointerUp: () => release(),
    onPointerCancel: () => release(),
    onLostPointerCapture: () => release(),
  };
  const release = () => {
    if (!grip.current) return;
    cancelAnimationFrame(frame.current);
    set();
    grip.current = null;
    setHeld(false);
  };

  const hold = useRef((event: PointerEvent<Element>, id: number) => begin(event, id, false)).current;
  const holdRim = useRef((event: PointerEvent<Element>, id: number) => begin(event, id, true)).current;
  return { isHeld, hold, holdRim, handlers };
}
