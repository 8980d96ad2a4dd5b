import { type PointerEvent, type RefObject, startTransition, useEffect, useRef, useState } from "react";
import type { NamedPulley } from "./beltState";
import { createHeldPulley } from "./heldPulley";
import { withPulley } from "./pulleyEdits";

type Change = { x: number; y: number } | { diameter: number };
type Grip = { id: number; isRim: boolean; fromX: number; fromY: number; pulley: NamedPulley; scale: number };

/** What a px is worth decides how finely a drag sets, mm. */
const stepOf = (scale: number) => (scale >= 8 ? 0.1 : scale >= 1.2 ? 0.5 : scale >= 0.3 ? 1 : 5);

/** How often the page hears of a drag, ms; what is dragged and the belt follow in each frame. */
const tellEveryMs = 120;

/**
 * Dragging of pulleys (`hold`) and of their rims (`holdRim`), by mouse, pen or finger.
 *
 * However many events come, what was dragged last is given to `held` once in each frame, for the belt and the pulley to
 * follow. The rest of the page, with its words, table and figures, hears of it a few times in a second, and at the end.
 */
export function usePulleyDrag(
  pulleys: readonly NamedPulley[],
  /** Px for each mm, as the board is drawn. */
  scale: RefObject<number>,
  onDrag: (id: number, change: Change) => void,
) {
  const [held] = useState(createHeldPulley);
  const [heldId, setHeldId] = useState<number | null>(null);
  const grip = useRef<Grip | null>(null);
  const next = useRef<Change | null>(null);
  const frame = useRef(0);
  const toldAt = useRef(0);
  const latest = useRef({ pulleys, onDrag });
  latest.current = { pulleys, onDrag };
  useEffect(() => () => cancelAnimationFrame(frame.current), []);

  const draw = (now: number) => {
    frame.current = 0;
    const [gripped, change] = [grip.current, next.current];
    if (!gripped || !change) return;
    held.set(withPulley([gripped.pulley], gripped.id, change)[0] ?? null);
    if (now - toldAt.current < tellEveryMs) return;
    toldAt.current = now;
    // In slices between frames: the table must not hold up the board.
    startTransition(() => latest.current.onDrag(gripped.id, change));
  };

  const begin = (event: PointerEvent<Element>, id: number, isRim: boolean) => {
    const pulley = latest.current.pulleys.find((one) => one.id === id);
    if (!pulley || event.button !== 0 || grip.current) return;
    event.currentTarget.setPointerCapture?.(event.pointerId);
    grip.current = { id, isRim, fromX: event.clientX, fromY: event.clientY, pulley, scale: scale.current };
    next.current = null;
    held.set(pulley);
    setHeldId(id);
  };
  const release = () => {
    const [gripped, change] = [grip.current, next.current];
    if (!gripped) return;
    cancelAnimationFrame(frame.current);
    frame.current = 0;
    grip.current = null;
    if (change) latest.current.onDrag(gripped.id, change);
    held.set(null);
    setHeldId(null);
  };

  /** For the board, which hears what the captured pulley does. */
  const handlers = {
    onPointerMove: (event: PointerEvent) => {
      const gripped = grip.current;
      if (!gripped) return;
      const [dx, dy] = [event.clientX - gripped.fromX, event.clientY - gripped.fromY];
      const step = stepOf(gripped.scale);
      const stepped = (mm: number) => Math.round(mm / step) * step;
      const { x, y, diameter } = gripped.pulley;
      next.current = gripped.isRim
        ? { diameter: Math.max(step, stepped(diameter + (2 * dx) / gripped.scale)) }
        : { x: stepped(x + dx / gripped.scale), y: stepped(y - dy / gripped.scale) };
      frame.current ||= requestAnimationFrame(draw);
    },
    onPointerUp: release,
    onPointerCancel: release,
    onLostPointerCapture: release,
  };

  const hold = useRef((event: PointerEvent<Element>, id: number) => begin(event, id, false)).current;
  const holdRim = useRef((event: PointerEvent<Element>, id: number) => begin(event, id, true)).current;
  return { held, heldId, hold, holdRim, handlers };
}
