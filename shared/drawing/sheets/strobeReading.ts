import { barsPerMinuteFor } from "#shared/domain/strobe";
import type { DiscRing } from "./discLayout";
import { shortNumber } from "./strobeWords";

type Part = { heading?: string; text: string };

/** One note for all rings whose bars pass by twos, threes or fours. */
function exactNote(rings: readonly DiscRing[]): Part[] {
  const [one, other] = rings;
  if (!one) return [];
  const text = other
    ? "Rings with bars by 2s, 3s or 4s show the true speed exactly, so many bars passing at each flash. Their bars are sharp only " +
      "under short flashes, and they also stand still at every 2nd, 3rd or 4th part of that speed: set the speed by the other ring first."
    : `The ring of ${one.bars} bars shows the true speed exactly, ${one.barsPerFlash} bars passing at each flash. Its bars are sharp only ` +
      `under short flashes, and it also stands still at every ${["half", "third", "quarter"][one.barsPerFlash - 2]} of that speed: ` +
      "set the speed by the other ring first.";
  return [{ text }];
}

/** How a disc is read, and what to mind: beside its rings on the sheet and on the page. */
export function readingParts(mainsHz: number, rings: readonly DiscRing[]): { left: Part[]; right: Part[] } {
  const perTenth = shortNumber(barsPerMinuteFor(mainsHz, 0.1), 2);
  const perHundred = shortNumber(barsPerMinuteFor(mainsHz, 1), 1);
  const multiple = rings.filter(({ barsPerFlash }) => barsPerFlash > 1);
  return {
    left: [
      ...exactNote(multiple),
      {
        heading: "The lamp",
        text:
          `A lamp on ${shortNumber(mainsHz, 2)} Hz mains flashes ${shortNumber(2 * mainsHz, 2)} times a second: a neon or a discharge lamp does, many LED lamps do not, ` +
          "and a lamp on batteries or an inverter keeps its own time. The reading is as good as the mains are at that moment.",
      },
    ],
    right: [
      {
        heading: "Read it",
        text:
          "Lay it flat on the turning platter, a record and the stylus on if you can. A ring that stands still turns at the speed written on it. " +
          "Bars creeping with the turning: fast. Against it: slow.",
      },
      {
        heading: "Count it",
        text:
          `Bars that pass a fixed mark in a minute: ${perTenth} are 0.1 %, ${perHundred} are 1 % from the speed written on the ring` +
          `${multiple.length > 0 ? ", and as many times more as bars pass at a flash" : ""}. Speed = (${shortNumber(120 * mainsHz, 1)} + bars forward in a minute) / bars of the ring.`,
      },
      {
        heading: "Mind",
        text:
          "Fingers, hair and sleeves away from what spins. Use a whole, covered lamp and leave the machine closed: mains work is for a licensed person under local codes. " +
          "Flicker can harm people with photosensitive epilepsy.",
      },
    ],
  };
}
