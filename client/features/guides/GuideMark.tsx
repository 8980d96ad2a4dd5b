import { kindFacts } from "#shared/domain/partKinds";
import { MeasuringDrawing } from "../../ui/measuring/MeasuringDrawing";
import type { GuideEntry } from "./measuringGuides";

const line = { fill: "none", stroke: "var(--color-ink)", strokeWidth: 1.6 } as const;
const blue = { fill: "none", stroke: "var(--color-measured)", strokeWidth: 2.2 } as const;
const bell = "M20 118C62 118 70 30 100 30S138 118 180 118";

const marks: Record<string, React.ReactNode> = {
  "rebuild-kit": (
    <>
      <path d="M20 28H180V128H20ZM20 78H180M100 28V128" {...line} stroke="var(--color-rule)" />
      <circle cx="60" cy="53" r="19" fill="var(--color-rubber)" stroke="var(--color-ink)" />
      <circle cx="60" cy="53" r="12" fill="var(--color-metal-fill)" stroke="var(--color-ink)" />
      <path d="M118 53a10 10 0 0 1 10 -10H152a10 10 0 0 1 0 20H128a10 10 0 0 1 -10 -10Z" {...line} strokeWidth="4" />
      <path d="M42 90H78V98H70V108H78V116H42V108H50V98H42Z" fill="var(--color-rubber)" stroke="var(--color-ink)" />
      <path d="M152 98a14 14 0 1 0 0 10" {...line} strokeWidth="3" />
    </>
  ),
  conditions: (
    <>
      <rect x="20" y="48" width="108" height="20" fill="var(--color-rubber)" stroke="var(--color-ink)" />
      <rect x="20" y="84" width="122" height="20" fill="var(--color-measured-fill)" stroke="var(--color-measured)" />
      <path d="M122 94H164M122 88V100M164 88V100M128 34V118" {...blue} strokeWidth="1.6" />
    </>
  ),
  "fit-chance": (
    <>
      <rect x="72" y="20" width="74" height="98" fill="var(--color-inband-fill)" stroke="var(--color-inband)" />
      <path d={bell} {...blue} />
      <path d="M12 118H188M40 118v6M70 118v6M100 118v6M130 118v6M160 118v6" {...line} />
    </>
  ),
  instruments: (
    <>
      <rect x="16" y="58" width="168" height="34" fill="var(--color-sheet)" stroke="var(--color-edge)" />
      <path
        d={Array.from({ length: 27 }, (_, i) => `M${22 + i * 6} 58v${i % 5 === 0 ? 16 : 9}`).join("")}
        {...line}
        strokeWidth="1"
      />
      <path d="M76 44H124M76 36V52M124 36V52M100 28V58" {...blue} />
    </>
  ),
  limits: (
    <>
      <path d="M20 112H180V120H20Z" fill="var(--color-rubber)" stroke="var(--color-ink)" />
      <path
        d="M80 24H120V78H112L100 112L88 78H80Z"
        fill="var(--color-sheet)"
        stroke="var(--color-edge)"
        strokeWidth="1.4"
      />
      <path
        d="M140 96V112M140 112l-4 -9M140 112l4 -9M140 136V120M140 120l-4 9M140 120l4 9"
        {...blue}
        strokeWidth="1.4"
      />
    </>
  ),
  cautions: (
    <>
      <path d="M28 56H52V100H28M52 68H36M52 88H36" {...line} strokeWidth="2.4" />
      <path
        d="M78 70H94M78 86H94M94 60H118C126 60 128 70 128 78S126 96 118 96H94ZM128 78C150 78 140 116 172 116"
        {...line}
        strokeWidth="2.4"
      />
      <path d="M70 38H112M112 38l-12 -5M112 38l-12 5" {...blue} />
    </>
  ),
};

/** What a guide is about: for a kind, its first size being taken. */
export function GuideMark({ guide: { slug, kinds } }: { guide: GuideEntry }) {
  const [kind] = kinds;
  if (kind) return <MeasuringDrawing kind={kind} dimension={kindFacts[kind].primary} className="h-auto w-full" />;
  return (
    <svg viewBox="0 0 200 156" className="h-auto w-full" aria-hidden="true">
      {marks[slug]}
    </svg>
  );
}
