import { type PointerEvent, type RefObject, startTransition, useCallback, useEffect, useRef, useState } from "react";
import type { NamedPulley } from "./beltState";
import { createHeldPulley } from "./heldPulley";
import { withPulley } from "./pulleyEdits";

type Change = { x: number; y: number } | { diameter: number };
type Grip = { id: number; isRim: boolean; fromX: number; fromY: number; pulley: NamedPulley; scale: number };

/** What a px is worth decides how finely a drag sets, mm. */
const stepOf = (scale: number) => (scale >= 8 ? 0.1 : scale >= 1.2 ? 0.5 : scale >= 0.3 ? 1 : 5);

/** The page hears of a drag when the pulley has rested so long, ms, and when it is let go. */
const restMs = 100;

/**
 * Dragging of pulleys (`hold`) and of their rims (`holdRim`), by mouse, pen or finger.
 *
 * However many events come, what was dragged last is given to `held` once in each frame, for the belt, its length and the
 * pulley to follow. The rest of the page, with its words and table, hears of it when the pulley rests, and at the end.
 */
export function usePulleyDrag(
  pulleys: readonly NamedPulley[],
  /** Px for each mm, as the board is drawn. */
  scale: RefObject<number>,
  onDrag: (id: number, change: Change) => void,
  board: RefObject<HTMLElement | null>,
) {
  const [held] = useState(createHeldPulley);
  const [heldId, setHeldId] = useState<number | null>(null);
  const grip = useRef<Grip | null>(null);
  const next = useRef<Change | null>(null);
  const frame = useRef(0);
  const rest = useRef<number | undefined>(undefined);
  const latest = useRef({ pulleys, onDrag });
  latest.current = { pulleys, onDrag };

  const draw = () => {
    frame.current = 0;
    const [gripped, change] = [grip.current, next.current];
    if (!gripped || !change) return;
    held.set(withPulley([gripped.pulley], gripped.id, change)[0] ?? null);
    window.clearTimeout(rest.current);
    rest.current = window.setTimeout(() => startTransition(() => latest.current.onDrag(gripped.id, change)), restMs);
  };
  const stop = useCallback(() => {
    cancelAnimationFrame(frame.current);
    window.clearTimeout(rest.current);
    frame.current = 0;
  }, []);
  useEffect(() => stop, [stop]);

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
    stop();
    grip.current = null;
    // Painted where it is let go before it is rendered there, so that both agree.
    if (change) {
      held.set(withPulley([gripped.pulley], gripped.id, change)[0] ?? null);
      latest.current.onDrag(gripped.id, change);
    }
    held.set(null);
    setHeldId(null);
  };

  const move = (event: globalThis.PointerEvent | MouseEvent) => {
    const gripped = grip.current;
    if (!gripped) return;
    // Nobody else has to look at it: the events of a drag are many.
    event.stopPropagation();
    if (event.type !== "pointermove") return;
    const [dx, dy] = [event.clientX - gripped.fromX, event.clientY - gripped.fromY];
    const step = stepOf(gripped.scale);
    const stepped = (mm: number) => Math.round(mm / step) * step;
    const { x, y, diameter } = gripped.pulley;
    next.current = gripped.isRim
      ? { diameter: Math.max(step, stepped(diameter + (2 * dx) / gripped.scale)) }
      : { x: stepped(x + dx / gripped.scale), y: stepped(y - dy / gripped.scale) };
    frame.current ||= requestAnimationFrame(draw);
  };
  const latestMove = useRef(move);
  latestMove.current = move;
  useEffect(() => {
    const element = board.current;
    const listen = (event: globalThis.PointerEvent | MouseEvent) => latestMove.current(event);
    const types = ["pointermove", "mousemove"] as const;
    for (const type of types) element?.addEventListener(type, listen);
    return () => {
      for (const type of types) element?.removeEventListener(type, listen);
    };
  }, [board]);

  /** For the board, which hears what the captured pulley does. */
  const handlers = { onPointerUp: release, onPointerCancel: release, onLostPointerCapture: release };

  const hold = useRef((event: PointerEvent<Element>, id: number) => begin(event, id, false)).current;
  const holdRim = useRef((event: PointerEvent<Element>, id: number) => begin(event, id, true)).current;
  return { held, heldId, hold, holdRim, handlers };
}
