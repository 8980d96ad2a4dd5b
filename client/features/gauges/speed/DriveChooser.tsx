import { PictureChoice } from "../PictureChoice";
import type { Drive } from "./speedState";

const choices: readonly { value: Drive; name: string; words: string }[] = [
  { value: "rim", name: "Rim drive", words: "a plain idler between motor and rim" },
  { value: "stepped-idler", name: "Stepped idler", words: "two treads on one hub" },
  { value: "belt", name: "Belt drive", words: "a belt to the platter" },
  { value: "capstan", name: "Capstan", words: "a tape moved by a shaft" },
];

/** Which drive: four small drawings to choose from. */
export function DriveChooser({ drive, onDrive }: { drive: Drive; onDrive: (drive: Drive) => void }) {
  return (
    <PictureChoice
      legend="The drive"
      name="drive"
      value={drive}
      onChoose={onDrive}
      columns="grid-cols-2 sm:grid-cols-4"
      choices={choices.map((choice) => ({ ...choice, picture: <DriveSketch drive={choice.value} /> }))}
    />
  );
}

const ink = { stroke: "var(--color-ink)", strokeWidth: 1.2, fill: "none" };
const metal = { ...ink, fill: "var(--color-metal-fill)" };
const rubber = { ...ink, fill: "var(--color-rubber)" };
const belt = { ...ink, strokeWidth: 2.4 };

function DriveSketch({ drive }: { drive: Drive }) {
  return (
    <svg width="96" height="56" viewBox="0 0 96 56" aria-hidden="true">
      {sketches[drive]}
    </svg>
  );
}

const sketches: Record<Drive, React.ReactNode> = {
  rim: (
    <>
      <path d="M20 54A44 44 0 0 1 92 30" {...ink} strokeWidth={4} />
      <circle cx="47" cy="34" r="14.5" {...rubber} />
      <circle cx="47" cy="34" r="10" {...metal} />
      <circle cx="64.5" cy="41.5" r="4" {...metal} />
    </>
  ),
  "stepped-idler": (
    <>
      <path d="M20 54A44 44 0 0 1 92 30" {...ink} strokeWidth={4} />
      <circle cx="44" cy="29" r="17" {...rubber} />
      <circle cx="44" cy="29" r="9" {...metal} />
      <circle cx="44" cy="29" r="2" {...ink} />
      <circle cx="62" cy="40" r="4" {...metal} />
    </>
  ),
  belt: (
    <>
      <circle cx="16" cy="28" r="5" {...metal} />
      <circle cx="66" cy="28" r="24" {...metal} />
      <path d="M14.2 22.6L58 4.4M14.2 33.4L58 51.6" {...belt} />
      <path d="M14.2 22.6A5.8 5.8 0 0 0 14.2 33.4M58 4.4A25 25 0 1 1 58 51.6" {...belt} />
    </>
  ),
  capstan: (
    <>
      <circle cx="12" cy="36" r="4" {...metal} />
      <circle cx="56" cy="36" r="17" {...metal} />
      <path d="M10.6 31L51 18.8M10.6 41L51 53.2" {...belt} />
      <circle cx="56" cy="36" r="4" {...metal} />
      <path d="M28 31.5H92" {...ink} strokeWidth={2} />
      <circle cx="56" cy="22" r="9" {...ink} strokeDasharray="3 2" />
    </>
  ),
};
