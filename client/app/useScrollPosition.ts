import { useEffect, useLayoutEffect, useRef } from "react";
import { useLocation, useNavigationType } from "react-router-dom";

const storeKey = "idlewright-scroll";
const patience = 1500;

function readStore(): Record<string, number> {
  try {
    return JSON.parse(sessionStorage.getItem(storeKey) ?? "{}");
  } catch {
    return {};
  }
}

/** Scrolls to y as soon as the page is tall enough, unless the reader scrolls first or it takes too long. */
function scrollWhenTall(y: number): () => void {
  let frame = 0;
  const started = performance.now();
  const stop = () => {
    cancelAnimationFrame(frame);
    for (const type of ["wheel", "touchstart", "keydown"]) removeEventListener(type, stop);
  };
  const attempt = () => {
    window.scrollTo(0, y);
    const reached = Math.abs(window.scrollY - y) < 2;
    if (reached || performance.now() - started > patience) stop();
    else frame = requestAnimationFrame(attempt);
  };
  for (const type of ["wheel", "touchstart", "keydown"]) addEventListener(type, stop, { passive: true });
  attempt();
  return stop;
}

/** Going back lands where one was; a new page begins at its top; the same page with another query stays. */
export function useScrollPosition(): void {
  const { key, pathname, hash } = useLocation();
  const how = useNavigationType();
  const positions = useRef<Record<string, number> | null>(null);
  positions.current ??= readStore();
  const last = useRef<string | null>(null);
  // Set before anything scrolls for the new page, so that its scrolling is not noted for the old one.
  const current = useRef(key);

  useEffect(() => {
    window.history.scrollRestoration = "manual";
    const keep = () => {
      try {
        sessionStorage.setItem(storeKey, JSON.stringify(positions.current));
      } catch {
        // No storage: positions last as long as the page.
      }
    };
    addEventListener("pagehide", keep);
    return () => removeEventListener("pagehide", keep);
  }, []);

  useEffect(() => {
    const note = () => {
      if (positions.current) positions.current[current.current] = window.scrollY;
    };
    addEventListener("scroll", note, { passive: true });
    return () => removeEventListener("scroll", note);
  }, []);

  useLayoutEffect(() => {
    const before = last.current;
    last.current = pathname;
    current.current = key;
    const saved = positions.current?.[key];
    if (how === "POP") return saved ? scrollWhenTall(saved) : undefined;
    if (hash) document.getElementById(hash.slice(1))?.scrollIntoView();
    else if (before !== pathname) window.scrollTo(0, 0);
    return undefined;
  }, [key, pathname, hash, how]);
}
