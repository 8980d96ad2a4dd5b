import { useMemo } from "react";
import { drawPart, type PartDrawingRequest } from "#shared/drawing/drawPart";
import { SceneSvg } from "./SceneSvg";
import { useOwnWidth } from "./useOwnWidth";

type PartDrawingProps = PartDrawingRequest & { className?: string };

/**
 * A part drawn from its numbers, in the page's own colours and type. A row drawing has the size it is given (150 by
 * 130 px where none is); a large one without a width takes the width of its place and is laid out again when that changes.
 */
export function PartDrawing({ className, ...request }: PartDrawingProps) {
  if (request.view === "large" && request.width === undefined)
    return <FluidDrawing className={className} request={request} />;
  return <FixedDrawing className={className} request={request} />;
}

type InnerProps = { request: PartDrawingRequest; className?: string | undefined };

function FluidDrawing({ request, className }: InnerProps) {
  const [place, width] = useOwnWidth(760);
  return (
    <div ref={place} className={className}>
      <FixedDrawing request={{ ...request, width }} />
    </div>
  );
}

function FixedDrawing({ request, className }: InnerProps) {
  const key = JSON.stringify(request);
  // Requests are plain numbers and words, so their text tells whether anything changed.
  const scene = useMemo(() => drawPart(JSON.parse(key) as PartDrawingRequest), [key]);
  return <SceneSvg scene={scene} className={className} />;
}
