import type { DiscRing } from "#shared/drawing/sheets/discLayout";
import type { Sheet } from "#shared/drawing/sheets/Sheet";
import { barsWords, shownWords } from "#shared/drawing/sheets/strobeWords";
import { SheetPicture } from "./SheetPicture";

type Props = { sheet: Sheet; rings: readonly DiscRing[] };

/** The pages of a sheet: one by itself, two side by side. */
export function SheetPictures({ sheet, rings }: Props) {
  const { pages } = sheet;
  const told =
    rings.length > 0 ? `: rings of ${rings.map((ring) => `${barsWords(ring)} (${shownWords(ring)})`).join("; ")}` : "";
  return (
    <div className={`grid gap-3 ${pages.length > 1 ? "sm:grid-cols-2" : ""}`}>
      {pages.map((page) => (
        <SheetPicture key={page.title} page={page} title={`${page.title}, as it will be printed${told}`} />
      ))}
    </div>
  );
}
