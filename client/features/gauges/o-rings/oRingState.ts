import { parseLength } from "#shared/domain/length";
import { storedUnit } from "../../../lib/preferences";
import { withItsUnit } from "../withItsUnit";

/** What the ring is for: a tyre on its seat, a belt over a path, or in place of a ring that was measured. */
export const ringUses = ["seat", "belt", "ring"] as const;
export type RingUse = (typeof ringUses)[number];

/** The page as it was written: lengths as texts. */
export type ORingState = {
  use: RingUse;
  /** The one size that each use begins with. */
  sizes: Record<RingUse, string>;
  section: string;
  /** The smallest groove-bottom diameter that a belt runs over. */
  groove: string;
  /** Number of the ring that is drawn; empty for the best. */
  pick: string;
};

/** The size of each use in the address. */
const sizeNames: Record<RingUse, string> = { seat: "seat", belt: "path", ring: "insideDiameter" };
const example: ORingState = {
  use: "seat",
  sizes: { seat: "26 mm", belt: "300 mm", ring: "24.9 mm" },
  section: "3.5 mm",
  groove: "16 mm",
  pick: "",
};

const reads = (text: string | null): text is string => text !== null && parseLength(text, storedUnit()).ok;

/** The address: `use`, the size under its name, `section`, `groove`, `ring`. What cannot be read falls back to the example. */
export const oRingCodec = {
  read(params: URLSearchParams): ORingState {
    const use = ringUses.find((one) => one === params.get("use")) ?? ringUses.find((one) => params.has(sizeNames[one]));
    if (!use) return example;
    const optional = (name: "section" | "groove") => {
      const text = params.get(name);
      if (!text?.trim()) return "";
      return reads(text) ? text : example[name];
    };
    const size = params.get(sizeNames[use]);
    const pick = params.get("ring") ?? "";
    return {
      use,
      sizes: { ...example.sizes, ...(reads(size) ? { [use]: size } : {}) },
      section: optional("section"),
      groove: use === "belt" ? optional("groove") : example.groove,
      pick: /^\d{3}$/.test(pick) ? pick : "",
    };
  },
  write({ use, sizes, section, groove, pick }: ORingState): URLSearchParams {
    const unit = storedUnit();
    const params = new URLSearchParams({ use });
    const put = (name: string, text: string) => {
      if (text.trim()) params.set(name, withItsUnit(text, unit));
    };
    put(sizeNames[use], sizes[use]);
    put("section", section);
    if (use === "belt") put("groove", groove);
    if (pick) params.set("ring", pick);
    return params;
  },
};
