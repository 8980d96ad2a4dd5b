import { type RefObject, useLayoutEffect, useRef, useState } from "react";

/** The width (whole px) of the element that the ref is set on; `before` until it is known. */
export function useOwnWidth(before: number): [RefObject<HTMLDivElement | null>, number] {
  const place = useRef<HTMLDivElement>(null);
  const [width, setWidth] = useState(before);
  useLayoutEffect(() => {
    const element = place.current;
    if (!element) return;
    const read = () => {
      const own = Math.floor(element.clientWidth);
      if (own > 0) setWidth(own);
    };
    read();
    if (typeof ResizeObserver === "undefined") return;
    const observer = new ResizeObserver(read);
    observer.observe(element);
    return () => observer.disconnect();
  }, []);
  return [place, width];
}
