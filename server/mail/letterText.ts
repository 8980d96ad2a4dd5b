import { type Block, type Letter, oneLine } from "./Letter";

function blockText(block: Block): string[] {
  if ("heading" in block) {
    const text = oneLine(block.heading);
    return ["", text, "-".repeat(Math.min(72, text.length))];
  }
  if ("paragraph" in block) return ["", oneLine(block.paragraph)];
  if ("lines" in block) return ["", ...block.lines.map(oneLine)];
  if ("facts" in block) return ["", ...block.facts.map(([label, value]) => `${oneLine(label)}: ${oneLine(value)}`)];
  const { title, sizes, forNeed, notes, amount } = block.part;
  const details = [sizes, forNeed && `For: ${forNeed}`, ...notes, amount].filter((text) => typeof text === "string");
  return ["", `* ${oneLine(title)}`, ...details.filter(Boolean).map((text) => `  ${oneLine(text)}`)];
}

/** The plain-text twin of a mail. */
export function letterText({ opening, action, blocks, why }: Letter): string {
  return [
    ...opening.flatMap((text) => [oneLine(text), ""]),
    ...(action ? [`${oneLine(action.label)}:`, action.url, ""] : []),
    ...blocks.flatMap(blockText),
    "",
    "-- ",
    "Idlewright: parts found by what you measure",
    oneLine(why),
    "",
  ]
    .join("\n")
    .replaceAll(/\n{3,}/g, "\n\n");
}
