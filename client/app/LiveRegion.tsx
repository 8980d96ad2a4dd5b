import { useEffect, useState } from "react";
import { onAnnounce } from "../lib/announcements";

/** Speaks what `announce` is given. The same words twice get a changed node, so that they are spoken twice. */
export function LiveRegion() {
  const [said, setSaid] = useState({ words: "", count: 0 });
  useEffect(() => onAnnounce((words) => setSaid(({ count }) => ({ words, count: count + 1 }))), []);
  return (
    <p role="status" aria-live="polite" className="sr-only">
      <span key={said.count}>{said.words}</span>
    </p>
  );
}
