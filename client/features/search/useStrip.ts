import { useState } from "react";
import { type Condition, conditionFacts, conditionsFor } from "#shared/domain/conditions";
import type { ParsedSize } from "#shared/domain/parseSize";
import { type DimensionName, dimensionsOf, type PartKind } from "#shared/domain/partKinds";
import { isWorkedOut } from "#shared/domain/writtenSize";
import { type NeedValues, primaryOf } from "../../lib/needParams";
import type { StripTools } from "./useStripTools";

/** `isLeftOut`: it is clear, but no part is left that it could have been read from, and so it is not searched. */
type SizeAsRead = { size: ParsedSize; problem: string | undefined; isLeftOut: boolean };
export type SizesAsRead = Partial<Record<DimensionName, SizeAsRead>>;

/** What is understood of the sizes as written, and what is wrong with each in words; empty ones are not wrong. */
export function sizesAsRead(
  { kind, lengths, unit, condition }: NeedValues,
  tools: StripTools | undefined,
): SizesAsRead {
  const sizes: SizesAsRead = {};
  for (const name of dimensionsOf(kind)) {
    const text = lengths[name]?.trim();
    if (!text || !tools) continue;
    const size = tools.parseSize(text, unit);
    const isLeftOut = "readingsMm" in size && !conditionFacts[condition].hasReadings;
    sizes[name] = { size, problem: size.ok ? undefined : size.problem, isLeftOut };
  }
  return sizes;
}

/** What the strip holds while it is being written: the need, and which sizes stand open. */
export function useStrip(initial: NeedValues) {
  const [values, setValues] = useState(initial);
  const [open, setOpen] = useState<DimensionName[]>(() => Object.keys(initial.lengths) as DimensionName[]);
  const isMeasured = conditionFacts[values.condition].hasReadings;
  const shown = dimensionsOf(values.kind).filter(
    (name) => (isMeasured && name === primaryOf(values.kind)) || open.includes(name),
  );

  /** Readings step aside while no part is left to have been measured, and come back with it. */
  const openFor = ({ lengths, condition }: NeedValues) => {
    const { hasReadings } = conditionFacts[condition];
    const texts = Object.entries(lengths) as [DimensionName, string | undefined][];
    setOpen(texts.flatMap(([name, text]) => (text && (hasReadings || isWorkedOut(text)) ? [name] : [])));
  };

  return {
    values,
    isMeasured,
    shown,
    closed: dimensionsOf(values.kind).filter((name) => !shown.includes(name)),
    set: (change: Partial<NeedValues>) => setValues((now) => ({ ...now, ...change })),
    setLength: (name: DimensionName, text: string) =>
      setValues((now) => ({ ...now, lengths: { ...now.lengths, [name]: text } })),
    /** Sizes that both kinds have are kept; a condition that the kind cannot be in is not. */
    setKind: (kind: PartKind) => setValues((now) => ({ ...now, kind, condition: keptCondition(kind, now.condition) })),
    setCondition: (condition: Condition) => {
      const next = { ...values, condition };
      setValues(next);
      if (conditionFacts[condition].hasReadings !== isMeasured) openFor(next);
    },
    openSize: (name: DimensionName) => setOpen((now) => [...now.filter((one) => one !== name), name]),
    closeSize: (name: DimensionName) => {
      setOpen((now) => now.filter((one) => one !== name));
      setValues((now) => ({ ...now, lengths: { ...now.lengths, [name]: undefined } }));
    },
  };
}
export type Strip = ReturnType<typeof useStrip>;

const keptCondition = (kind: PartKind, condition: Condition): Condition =>
  conditionsFor(kind).includes(condition) ? condition : "sound";
