import { createElement, useId } from "react";
import type { PathItem, SheetItem, SheetPage, Step, WordsItem } from "#shared/drawing/sheets/Sheet";

type Props = { page: SheetPage; title: string; className?: string };

/** Thousandths of a millimetre are finer than any screen. */
const short = (mm: number) => Math.round(mm * 1000) / 1000;
const stepText = ([verb, ...numbers]: Step) => verb + numbers.map(short).join(" ");
const colour = (shade: PathItem["shade"]) => (shade === "ink" ? "var(--color-ink)" : "var(--color-soft)");

function Path({ steps, strokeMm, isDashed, shade }: PathItem) {
  const d = steps.map(stepText).join("");
  if (strokeMm === undefined) return <path d={d} fill={colour(shade)} />;
  return (
    <path
      d={d}
      fill="none"
      stroke={colour(shade)}
      strokeWidth={strokeMm}
      strokeDasharray={isDashed ? "1.6 1" : undefined}
    />
  );
}

function Words({ x, y, content, sizeMm, weight, anchor, turnDeg, shade }: WordsItem) {
  return (
    <text
      transform={`translate(${short(x)} ${short(y)})${turnDeg === 0 ? "" : ` rotate(${short(turnDeg)})`}`}
      fontSize={sizeMm}
      fontWeight={weight}
      textAnchor={anchor}
      fill={colour(shade)}
    >
      {content}
    </text>
  );
}

/** Items have no names and never change places: a page is drawn anew as a whole. */
const toNode = (item: SheetItem, index: number) =>
  item.type === "path" ? createElement(Path, { ...item, key: index }) : createElement(Words, { ...item, key: index });

/** A page as it will be printed, drawn from the same items as its PDF. */
export function SheetPicture({ page, title, className = "" }: Props) {
  const id = useId();
  return (
    <svg
      role="img"
      aria-labelledby={id}
      viewBox={`0 0 ${page.widthMm} ${page.heightMm}`}
      className={`gauge-sheet ${className}`}
    >
      <title id={id}>{title}</title>
      {page.items.map(toNode)}
    </svg>
  );
}
