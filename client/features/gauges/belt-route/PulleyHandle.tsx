import { type KeyboardEvent, memo, type PointerEvent } from "react";
import type { NamedPulley } from "./beltState";
import { toPx, type View } from "./boardView";

type Props = {
  pulley: NamedPulley;
  view: View;
  /** Read out when it has the focus: name, place, size. */
  words: string;
  isSelected: boolean;
  onHold: (event: PointerEvent<Element>, id: number) => void;
  onKey: (event: KeyboardEvent, id: number) => void;
  onSelect: (id: number) => void;
};

/**
 * What a pulley is dragged by, and moved with the arrow keys: lies over it, at least as large as a fingertip. While it is
 * held it waits, unseen, until the pulley rests.
 */
export const PulleyHandle = memo(function PulleyHandle(props: Props) {
  const { pulley, view, words, isSelected, onHold, onKey, onSelect } = props;
  const { id } = pulley;
  const { x, y } = toPx(view, pulley);
  const reach = Math.max((pulley.diameter / 2) * view.scale, 22);
  return (
    <button
      type="button"
      aria-label={words}
      aria-pressed={isSelected}
      className="belt-handle"
      // Tab follows the order of the belt; a small pulley before a large one lies on top, so that it can be reached.
      style={{
        width: 2 * reach,
        height: 2 * reach,
        zIndex: Math.max(1, 1000 - Math.round(reach)),
        transform: `translate(${x - reach}px, ${y - reach}px)`,
      }}
      onPointerDown={(event) => onHold(event, id)}
      onKeyDown={(event) => onKey(event, id)}
      onFocus={() => onSelect(id)}
      onClick={() => onSelect(id)}
    />
  );
});
