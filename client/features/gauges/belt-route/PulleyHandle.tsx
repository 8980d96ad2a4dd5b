import { type KeyboardEvent, memo, type PointerEvent } from "react";

type Props = {
  id: number;
  /** Read out when it has the focus: name, place, size. */
  words: string;
  x: number;
  y: number;
  radius: number;
  isSelected: boolean;
  onHold: (event: PointerEvent<Element>, id: number) => void;
  onKey: (event: KeyboardEvent, id: number) => void;
  onSelect: (id: number) => void;
};

/** What a pulley is dragged by, and moved with the arrow keys: lies over it, at least as large as a fingertip. */
export const PulleyHandle = memo(function PulleyHandle(props: Props) {
  const { id, words, x, y, radius, isSelected, onHold, onKey, onSelect } = props;
  const reach = Math.max(radius, 22);
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
