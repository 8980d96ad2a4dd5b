import { type Caution, cautions } from "../../ui/measuring/cautions";
import { CautionMark } from "./CautionMark";
import { GuideSection } from "./GuideSection";
import { Points } from "./Points";

const further: Record<Caution, { title: string; points: readonly string[] }> = {
  power: {
    title: "Mains and charge",
    points: [
      "Pull the plug from the wall: a switch is not enough.",
      "Capacitors keep their charge after the plug is out, in valve sets for minutes and longer.",
      "If you are not used to live circuits, leave everything behind the mains transformer closed.",
    ],
  },
  spinning: {
    title: "Spinning parts",
    points: [
      "Nothing is measured while it turns, a strobe disc and a speed check apart.",
      "Put covers and guards back before the first run; a loose belt whips.",
    ],
  },
  tar: {
    title: "Rubber gone to tar",
    points: [
      "Scrape with wood or plastic: metal scores the wheel and its pulley.",
      "What is melted has no size left. Do not measure it; use the pulleys or the mechanism family.",
      "Bag the residue and ask your local waste service where it goes.",
    ],
  },
  solvent: {
    title: "Solvents",
    points: [
      "Little on a cloth, never poured. Let it dry off before you measure: wet rubber is swollen.",
      "Try it on a hidden place first: some solvents eat plastic wheels and lacquer.",
    ],
  },
  dust: {
    title: "Grinding dust",
    points: [
      "Trueing a wheel makes fine dust: work outside or with suction at the tool.",
      "Old brake pads may hold asbestos. Do not file or blow them; leave them to somebody who is licensed for it.",
    ],
  },
};

/** What can hurt, drawn and said. */
export function CautionsGuide() {
  return (
    <>
      {(Object.keys(cautions) as Caution[]).map((name) => (
        <GuideSection key={name} title={further[name].title}>
          <div className="grid grid-cols-[5rem_1fr] gap-x-5 sm:grid-cols-[7rem_1fr]">
            <CautionMark name={name} />
            <div className="grid content-start gap-2">
              <p className="max-w-prose font-semibold">{cautions[name]}</p>
              <Points points={further[name].points} />
            </div>
          </div>
        </GuideSection>
      ))}
      <p className="mt-8 max-w-prose">
        Sizes and chances are aids: check on the machine before you close it up. These are the usual cautions, common
        practice without a source; what the law of your country says comes first.
      </p>
    </>
  );
}
