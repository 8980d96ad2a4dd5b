import { useState } from "react";
import { type Condition, conditionsFor } from "#shared/domain/conditions";
import { parseLength } from "#shared/domain/length";
import { type DimensionName, dimensionsOf, type PartKind } from "#shared/domain/partKinds";
import { type NeedValues, primaryOf } from "../../lib/needParams";

export type LengthProblems = Partial<Record<DimensionName, string>>;

/** What is wrong with the lengths as written, in words; empty ones are not wrong. */
export function lengthProblems({ kind, lengths, unit }: NeedValues): LengthProblems {
  const problems: LengthProblems = {};
  for (const name of dimensionsOf(kind)) {
    const text = lengths[name]?.trim();
    const read = text ? parseLength(text, unit) : undefined;
    if (read && !read.ok) problems[name] = read.problem;
  }
  return problems;
}

/** What the strip holds while it is being written: the need, and which sizes stand open. */
export function useStrip(initial: NeedValues) {
  const [values, setValues] = useState(initial);
  const [open, setOpen] = useState<DimensionName[]>(() => Object.keys(initial.lengths) as DimensionName[]);
  const shown = dimensionsOf(values.kind).filter((name) => name === primaryOf(values.kind) || open.includes(name));

  return {
    values,
    shown,
    closed: dimensionsOf(values.kind).filter((name) => !shown.includes(name)),
    set: (change: Partial<NeedValues>) => setValues((now) => ({ ...now, ...change })),
    setLength: (name: DimensionName, text: string) =>
      setValues((now) => ({ ...now, lengths: { ...now.lengths, [name]: text } })),
    /** Sizes that both kinds have are kept; a condition that the kind cannot be in is not. */
    setKind: (kind: PartKind) => setValues((now) => ({ ...now, kind, condition: keptCondition(kind, now.condition) })),
    openSize: (name: DimensionName) => setOpen((now) => [...now.filter((one) => one !== name), name]),
    closeSize: (name: DimensionName) => {
      setOpen((now) => now.filter((one) => one !== name));
      setValues((now) => ({ ...now, lengths: { ...now.lengths, [name]: undefined } }));
    },
  };
}

const keptCondition = (kind: PartKind, condition: Condition): Condition =>
  conditionsFor(kind).includes(condition) ? condition : "sound";
