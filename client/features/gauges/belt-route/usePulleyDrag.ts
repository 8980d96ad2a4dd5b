import { type PointerEvent, type RefObject, startTransition, useEffect, useRef, useState } from "react";
import { flushSync } from "react-dom";
import type { NamedPulley } from "./beltState";
import { withPulley } from "./pulleyEdits";

type Change = { x: number; y: number } | { diameter: number };
type Grip = { id: number; isRim: boolean; fromX: number; fromY: number; pulley: NamedPulley; scale: number };

/** What a px is worth decides how finely a drag sets, mm. */
const stepOf = (scale: number) => (scale >= 8 ? 0.1 : scale >= 1.2 ? 0.5 : scale >= 0.3 ? 1 : 5);

/** How often the page hears of a drag, ms; the board itself follows in each frame. */
const tellEveryMs = 120;

/**
 * Dragging of pulleys (`hold`) and of their rims (`holdRim`), by mouse, pen or finger.
 *
 * However many events come, what was dragged last is drawn once in each frame, as `draft`: the pulleys while one is held.
 * The page, with its table and figures, hears of it a few times in a second, and when the pulley is let go.
 */
export function usePulleyDrag(
  pulleys: readonly NamedPulley[],
  /** Px for each mm, as the board is drawn. */
  scale: RefObject<number>,
  onDrag: (id: number, change: Change) => void,
) {
  const [draft, setDraft] = useState<readonly NamedPulley[] | null>(null);
  const grip = useRef<Grip | null>(null);
  const next = useRef<Change | null>(null);
  const frame = useRef(0);
  const toldAt = useRef(0);
  const latest = useRef({ pulleys, onDrag });
  latest.current = { pulleys, onDrag };
  useEffect(() => () => cancelAnimationFrame(frame.current), []);

  const draw = (now: number) => {
    frame.current = 0;
    const [held, change] = [grip.current, next.current];
    if (!held || !change) return;
    flushSync(() => setDraft(withPulley(latest.current.pulleys, held.id, change)));
    if (now - toldAt.current < tellEveryMs) return;
    toldAt.current = now;
    // In slices between frames: the table must not hold up the board.
    startTransition(() => latest.current.onDrag(held.id, change));
  };

  const begin = (event: PointerEvent<Element>, id: number, isRim: boolean) => {
    const pulley = latest.current.pulleys.find((one) => one.id === id);
    if (!pulley || event.button !== 0 || grip.current) return;
    event.currentTarget.setPointerCapture?.(event.pointerId);
    grip.current = { id, isRim, fromX: event.clientX, fromY: event.clientY, pulley, scale: scale.current };
    next.current = null;
    setDraft(latest.current.pulleys);
  };
  const release = () => {
    const [held, change] = [grip.current, next.current];
    if (!held) return;
    cancelAnimationFrame(frame.current);
    frame.current = 0;
    grip.current = null;
    if (change) latest.current.onDrag(held.id, change);
    setDraft(null);
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
      frame.current ||= requestAnimationFrame(draw);
    },
    onPointerUp: release,
    onPointerCancel: release,
    onLostPointerCapture: release,
  };

  const hold = useRef((event: PointerEvent<Element>, id: number) => begin(event, id, false)).current;
  const holdRim = useRef((event: PointerEvent<Element>, id: number) => begin(event, id, true)).current;
  return { draft, hold, holdRim, handlers };
}
