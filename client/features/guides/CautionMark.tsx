import type { Caution } from "../../ui/measuring/cautions";

const ink = { fill: "none", stroke: "var(--color-ink)", strokeWidth: 2 } as const;
const blue = { fill: "none", stroke: "var(--color-measured)", strokeWidth: 2 } as const;
const dark = { fill: "var(--color-rubber)", stroke: "var(--color-ink)", strokeWidth: 1.5 } as const;

const pictures: Record<Caution, React.ReactNode> = {
  // A plug drawn out of its socket.
  power: (
    <>
      <path d="M8 30H24V66H8M24 40H14M24 56H14" {...ink} />
      <path d="M40 42H52M40 54H52M52 34H68C74 34 76 42 76 48S74 62 68 62H52ZM76 48C88 48 82 74 94 74" {...ink} />
      <path d="M36 20H60M60 20l-9 -4M60 20l-9 4" {...blue} />
    </>
  ),
  // A wheel with the direction that it turns in.
  spinning: (
    <>
      <circle cx="48" cy="50" r="26" {...dark} />
      <circle cx="48" cy="50" r="18" fill="var(--color-metal-fill)" stroke="var(--color-ink)" />
      <circle cx="48" cy="50" r="3" fill="var(--color-ground)" stroke="var(--color-ink)" />
      <path d="M14 40A36 36 0 0 1 68 20M68 20l-11 -1M68 20l-5 9" {...blue} />
    </>
  ),
  // A belt that has run down from its pulley.
  tar: (
    <>
      <circle cx="48" cy="36" r="20" fill="var(--color-metal-fill)" stroke="var(--color-ink)" strokeWidth="1.5" />
      <path
        d="M24 36A24 24 0 0 1 72 36C72 46 76 52 74 66C73 74 66 74 65 66C64 56 62 58 60 74C59 86 50 86 49 74C48 64 44 60 42 68C41 76 34 76 33 68C32 56 24 50 24 36ZM30 36A18 18 0 0 0 66 36A18 18 0 0 0 30 36Z"
        fillRule="evenodd"
        {...dark}
      />
    </>
  ),
  // An open bottle and what rises from it.
  solvent: (
    <>
      <path d="M36 42H60V52L70 62V88H26V62L36 52ZM26 70H70" {...ink} />
      <path d="M40 34q-6 -6 0 -12t0 -12M48 34q-6 -6 0 -12t0 -12M56 34q-6 -6 0 -12t0 -12" {...blue} />
    </>
  ),
  // A wheel held to a stone, and the dust.
  dust: (
    <>
      <circle cx="28" cy="44" r="20" {...dark} />
      <rect x="48" y="20" width="14" height="52" fill="var(--color-metal-fill)" stroke="var(--color-ink)" />
      <path
        d="M44 70h2M52 78h2M60 84h2M40 82h2M68 78h2M50 88h2M72 88h2M34 88h2M62 76h2M80 84h2"
        {...blue}
        strokeWidth="3"
      />
    </>
  ),
};

/** What a caution is about, in one picture. */
export function CautionMark({ name }: { name: Caution }) {
  return (
    <svg viewBox="0 0 96 96" className="h-auto w-full" aria-hidden="true">
      {pictures[name]}
    </svg>
  );
}
