import type { ReactNode } from "react";
import { PictureChoice } from "../PictureChoice";
import type { SheetKind } from "./sheetsState";

const choices: readonly { value: SheetKind; name: string; words: string }[] = [
  { value: "strobe", name: "Stroboscope disc", words: "is it turning at its speed?" },
  { value: "ring-gauge", name: "Ring gauge", words: "diameters of wheels and bores" },
  { value: "belt-ruler", name: "Belt ruler", words: "around the inside, at a glance" },
];

const thin = { stroke: "var(--color-ink)", strokeWidth: 1.2, fill: "none" };

const sketches: Record<SheetKind, ReactNode> = {
  strobe: (
    <>
      <circle cx="48" cy="28" r="23" {...thin} strokeWidth={5} strokeDasharray="2 2.01" />
      <circle cx="48" cy="28" r="14" {...thin} strokeWidth={5} strokeDasharray="2.5 2.53" />
      <circle cx="48" cy="28" r="3" {...thin} />
    </>
  ),
  "ring-gauge": (
    <>
      {[6, 12, 18, 24].map((r) => (
        <circle key={r} cx="48" cy="28" r={r} {...thin} />
      ))}
      <path d="M22 28H74M48 2V54" {...thin} strokeWidth={0.8} />
    </>
  ),
  "belt-ruler": (
    <>
      <path d="M8 36H90V52H8Z" {...thin} />
      <path d="M8 36v9M18 36v5M28 36v5M38 36v5M48 36v9M58 36v5M68 36v5M78 36v5" {...thin} />
      <rect x="9" y="14" width="62" height="12" rx="6" {...thin} strokeWidth={3.4} stroke="var(--color-measured)" />
    </>
  ),
};

/** Which sheet: three small drawings to choose from. */
export function SheetChooser({ sheet, onSheet }: { sheet: SheetKind; onSheet: (sheet: SheetKind) => void }) {
  return (
    <PictureChoice
      legend="The sheet"
      name="sheet"
      value={sheet}
      onChoose={onSheet}
      columns="sm:grid-cols-3"
      isListOnPhone
      choices={choices.map((choice) => ({
        ...choice,
        picture: (
          <svg viewBox="0 0 96 56" aria-hidden="true" className="w-24 max-w-full">
            {sketches[choice.value]}
          </svg>
        ),
      }))}
    />
  );
}
