import { signPath } from "#shared/drawing/signMark";
import { signWidthEm, textWidth } from "#shared/drawing/textWidth";
import { type LabelLine, labelSize, lineHeight, lineWidth, type TrainLabel } from "./trainLabels";

type Anchor = "start" | "middle";

/** One line of a label. The diameter sign before its number is drawn, since few fonts have it. */
function Line({ line, x, y, colour }: { line: LabelLine; x: number; y: number; colour: string }) {
  const { name, number, look } = line;
  const size = labelSize[look];
  const weight = look === "soft" ? 500 : 600;
  const words = { y, fontSize: size, fontWeight: weight, fill: colour };
  // The words keep to the room that was reckoned for them, whichever font the page ends up with.
  const room = (text: string) => ({
    textLength: textWidth(text.trimEnd(), size, weight),
    lengthAdjust: "spacingAndGlyphs",
  });
  const afterName = x + textWidth(name, size, weight);
  const struck = look === "struck" ? `M${x - 2} ${y - size * 0.3}H${x + lineWidth(line) + 2}` : undefined;
  return (
    <>
      <text x={x} {...words} {...room(name)}>
        {name.trimEnd()}
      </text>
      {number !== undefined && (
        <>
          <path
            d={signPath("diameter", size)}
            transform={`translate(${afterName} ${y})`}
            fill="none"
            stroke={colour}
            strokeWidth={size * 0.085}
          />
          <text x={afterName + signWidthEm * size} {...words} {...room(number)}>
            {number}
          </text>
        </>
      )}
      {struck && <path d={struck} stroke={colour} strokeWidth={1.4} />}
    </>
  );
}

/** The words beside a size: in blue if it sets the speed, pale and struck if it cancels. */
export function LabelLines({ label, x, y, anchor }: { label: TrainLabel; x: number; y: number; anchor: Anchor }) {
  return label.lines.map((line, i) => (
    <Line
      key={`${line.name}${line.number ?? ""}`}
      line={line}
      x={anchor === "start" ? x : x - lineWidth(line) / 2}
      y={y + i * lineHeight}
      colour={`var(--color-${line.look === "size" ? "measured" : "soft"})`}
    />
  ));
}
