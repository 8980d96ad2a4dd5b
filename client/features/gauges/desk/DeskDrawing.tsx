import { useId } from "react";
import { Hatches } from "../Hatches";
import { type DeskDrawingName, deskDrawings } from "./deskDrawings";

/** What a gauge is about, drawn as on its own board. */
export function DeskDrawing({ name }: { name: DeskDrawingName }) {
  const id = useId();
  const Drawing = deskDrawings[name];
  return (
    <svg viewBox="0 0 240 150" className="block w-full border border-rule bg-sheet" aria-hidden="true">
      <Hatches id={id} />
      <Drawing rubber={`url(#${id}-rubber)`} metal={`url(#${id}-metal)`} />
    </svg>
  );
}
