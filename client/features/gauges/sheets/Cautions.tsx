import { RuledHeading } from "../../../ui/RuledHeading";
import type { SheetKind } from "./sheetsState";

const cautions: Record<SheetKind, readonly string[]> = {
  strobe: [
    "Keep fingers, hair and sleeves away from what spins.",
    "Use a whole, covered lamp and leave the machine closed. Mains work is for a licensed person under local codes.",
    "Flicker can harm people with photosensitive epilepsy.",
    "Many LED lamps do not flash with the mains, and a lamp on batteries or an inverter keeps its own time: a neon or a discharge lamp on the mains does.",
  ],
  "ring-gauge": [
    "Paper tells you which size to look for; order by a calliper.",
    "Cut away from your hand. The machine is unplugged while you measure in it.",
  ],
  "belt-ruler": [
    "A belt that was stretched while it was read is read too long: lay it down loose.",
    "The residue of a tarred belt stains: gloves on, and do not breathe its dust.",
  ],
};

/** What to mind with a sheet. */
export function Cautions({ sheet }: { sheet: SheetKind }) {
  return (
    <section className="grid gap-2">
      <RuledHeading>Mind</RuledHeading>
      <ul className="grid gap-1.5 text-soft">
        {cautions[sheet].map((words) => (
          <li key={words}>{words}</li>
        ))}
      </ul>
    </section>
  );
}
