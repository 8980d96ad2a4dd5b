import { useEffect, useRef } from "react";

const isTyping = (target: EventTarget | null) =>
  target instanceof HTMLElement && (target.isContentEditable || /^(INPUT|TEXTAREA|SELECT)$/.test(target.tagName));

/** Calls back when "/" is pressed outside any field. */
export function useSlashKey(onSlash: () => void): void {
  const latest = useRef(onSlash);
  latest.current = onSlash;
  useEffect(() => {
    const listen = (event: KeyboardEvent) => {
      if (event.key !== "/" || event.ctrlKey || event.metaKey || event.altKey || isTyping(event.target)) return;
      event.preventDefault();
      latest.current();
    };
    addEventListener("keydown", listen);
    return () => removeEventListener("keydown", listen);
  }, []);
}
