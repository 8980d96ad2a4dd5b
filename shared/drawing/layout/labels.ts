import type { DimensionName } from "#shared/domain/partKinds";
import { dimensionText, type LengthUnit } from "../dimensionText";
import type { PartSizes } from "../parts/PartSizes";
import type { Box, DimensionSign, TextItem, TextRole } from "../Scene";
import { textWidth } from "../textWidth";
import type { DrawingStyle } from "./DrawingStyle";

export type LabelLine = { content: string; role: TextRole; size: number; weight: 500 | 600; sign?: DimensionSign };
export type Label = { lines: LabelLine[]; width: number; height: number };

const lineHeight = 1.2;

/**
 * The words of a dimension: what the workshop states, then what the user measured.
 * `stacked` puts the tolerance on a line of its own. Undefined when nothing is known of the dimension.
 */
export function dimensionLabel(
  name: DimensionName,
  sizes: PartSizes,
  unit: LengthUnit,
  style: DrawingStyle,
  { sign, stacked = false }: { sign?: DimensionSign | undefined; stacked?: boolean } = {},
): Label | undefined {
  const lines: LabelLine[] = [];
  const { digits, words, full } = style;
  const stated = sizes.role(name) === "outline" ? sizes.stated[name] : undefined;
  const found = sizes.found(name);
  const signed = sign ? { sign } : {};
  if (stated) {
    const { nominal, tolerance } = dimensionText(stated, unit);
    const beside = full && tolerance && !stacked ? ` ${tolerance}` : "";
    lines.push({ content: nominal + beside, role: "stated", size: digits, weight: 600, ...signed });
    if (full && tolerance && stacked) {
      lines.push({ content: tolerance, role: "tolerance", size: digits, weight: 500 });
    }
  }
  if (found && (full || !stated)) {
    const { nominal } = dimensionText({ nominalMm: found }, unit);
    const line = { role: "measured", size: full ? words + 1 : digits, weight: 600 } as const;
    if (stated) lines.push({ ...line, content: `yours ${nominal}` });
    else lines.push({ ...line, content: full && !stacked ? `${nominal} yours` : nominal, ...signed });
    if (!stated && full && stacked) lines.push({ ...line, content: "yours", size: words, weight: 500 });
  }
  return lines.length === 0 ? undefined : label(lines);
}

export function label(lines: LabelLine[]): Label {
  const width = Math.max(...lines.map((l) => textWidth(l.content, l.size, l.weight, l.sign)));
  return { lines, width, height: lines.reduce((sum, l) => sum + l.size * lineHeight, 0) };
}

/** Sets a label into the box whose top left corner is given; lines keep to `align`. A turned label reads upwards. */
export function setLabel(
  { lines, width }: Label,
  at: { x: number; y: number },
  { align = "middle", turned = false }: { align?: "start" | "middle" | "end"; turned?: boolean } = {},
): TextItem[] {
  let down = 0;
  return lines.map((line) => {
    const own = textWidth(line.content, line.size, line.weight, line.sign);
    const inset = align === "start" ? 0 : (width - own) / (align === "middle" ? 2 : 1);
    const tall = line.size * lineHeight;
    const box: Box = turned
      ? { x: at.x + down, y: at.y + width - inset - own, width: tall, height: own }
      : { x: at.x + inset, y: at.y + down, width: own, height: tall };
    down += tall;
    const { content, role, size, weight, sign } = line;
    return { type: "text", role, content, size, weight, turned, box, ...(sign ? { sign } : {}) };
  });
}
