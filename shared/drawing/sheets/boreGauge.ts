import { framedPage, roomOf } from "./pageFrame";
import type { Paper } from "./papers";
import { line, path } from "./paths";
import { printError } from "./printError";
import type { SheetItem, SheetPage } from "./Sheet";
import { column, words } from "./words";

/** A rule whose width grows from one end to the other: it stops in a bore where it is as wide as the bore. */
export type TaperedRule = { fromMm: number; toMm: number; lengthMm: number };

/** One step of 0.1 mm is 2 mm long on the first, 1 mm on the second. */
export const taperedRules: readonly TaperedRule[] = [
  { fromMm: 3, toMm: 11, lengthMm: 160 },
  { fromMm: 11, toMm: 27, lengthMm: 160 },
];

const gripMm = 16;

function ruleItems({ fromMm, toMm, lengthMm }: TaperedRule, left: number, cy: number): SheetItem[] {
  const at = (width: number) => left + ((width - fromMm) / (toMm - fromMm)) * lengthMm;
  const right = left + lengthMm;
  const across = (width: number, share: number): SheetItem[] => {
    const [x, half] = [at(width), width / 2];
    const pen = { strokeMm: share === 1 ? 0.18 : 0.1 };
    if (share === 1) return [line(x, cy - half, x, cy + half, pen)];
    return [-1, 1].map((side) => line(x, cy + side * half, x, cy + side * half * (1 - share), pen));
  };
  const steps = Math.round((toMm - fromMm) * 10);
  const marks = Array.from({ length: steps + 1 }, (_, i) => i).flatMap((i) => {
    const width = fromMm + i / 10;
    if (i % 10 !== 0) return across(width, i % 5 === 0 ? 0.45 : 0.22);
    const sizeMm = Math.min(3, width * 0.5);
    const number = words(at(width) + 0.7, cy + sizeMm * 0.33, String(Math.round(width)), { sizeMm, weight: 600 });
    return [...across(width, 1), ...(i < steps ? [number] : [])];
  });
  const outline = path(
    [
      ["M", left, cy - fromMm / 2],
      ["L", right, cy - toMm / 2],
      ["L", right + gripMm, cy - toMm / 2],
      ["L", right + gripMm, cy + toMm / 2],
      ["L", right, cy + toMm / 2],
      ["L", left, cy + fromMm / 2],
      ["Z"],
    ],
    { strokeMm: 0.1 },
  );
  const grip = words(right + gripMm / 2, cy + 1, `${fromMm} to ${toMm}`, {
    sizeMm: 2.6,
    weight: 600,
    anchor: "middle",
  });
  return [outline, ...marks, grip];
}

/** A page of tapered rules to cut out, for bores from 3 to 27 mm. */
export function boreGaugePage(paper: Paper): SheetPage {
  const room = roomOf(paper);
  return framedPage(paper, "Bore gauge", [{ label: "For bores of", value: "3 to 27 mm" }], () => {
    const rules = taperedRules.flatMap((rule, i) => ruleItems(rule, room.left + 4, room.top + 16 + i * 34));
    const text = column(room.left + 4, room.top + 76, 120, [
      {
        heading: "Use it",
        text:
          "Glue the page to thin, stiff card and cut along the middle of the outer lines with a knife and a steel rule. " +
          "Push the narrow end square into the bore until both edges touch, without force: soft rubber and thin card both give way. " +
          "Read the width at the face of the bore: long marks are millimetres, short ones tenths.",
      },
      {
        heading: "What it can tell",
        text: `${printError([20])} A bore is oval or worn more often than not: turn the rule and take the smallest reading. Order by a calliper or a pin gauge.`,
      },
      { heading: "Mind", text: "Cut away from your hand. The machine is unplugged while you measure in it." },
    ]);
    return [...rules, ...text.items];
  });
}
