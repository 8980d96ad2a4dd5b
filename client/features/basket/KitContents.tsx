import type { PartSummary } from "#shared/schemas/part";

/** What a rebuild kit holds, in one line. */
export function KitContents({ lines }: { lines: PartSummary["kitLines"] }) {
  const words = lines.map(({ quantity, title }) => (quantity > 1 ? `${quantity} × ${title}` : title));
  return <p className="text-soft">{words.join(", ")}</p>;
}
