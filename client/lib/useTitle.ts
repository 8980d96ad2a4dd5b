import { useEffect } from "react";

/** Sets the document's title: what the page is, then the name of the site. */
export function useTitle(title: string | null): void {
  useEffect(() => {
    document.title = title ? `${title} · Idlewright` : "Idlewright";
  }, [title]);
}
