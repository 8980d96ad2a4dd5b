import { useState } from "react";
import { announce } from "../../lib/announcements";
import { Button } from "../../ui/Button";

/** The whole state of a gauge stands in its address, so that copying the address shares the gauge. */
export function GaugeActions() {
  const [words, setWords] = useState("Copy link");
  const copy = async () => {
    try {
      await navigator.clipboard.writeText(window.location.href);
      setWords("Link copied");
      announce("Link copied");
    } catch {
      setWords("Copy it from the address bar");
    }
  };
  return (
    <div className="flex gap-x-5 print:hidden">
      <Button look="quiet" onClick={() => void copy()} onBlur={() => setWords("Copy link")}>
        {words}
      </Button>
      <Button look="quiet" onClick={() => window.print()}>
        Print
      </Button>
    </div>
  );
}
