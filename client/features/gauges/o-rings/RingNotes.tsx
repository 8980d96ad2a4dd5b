import { Link } from "react-router-dom";
import { RuledHeading } from "../../../ui/RuledHeading";
import type { RingUse } from "./oRingState";

/** What the numbers leave out. */
export function RingNotes({ use }: { use: RingUse }) {
  return (
    <section className="grid max-w-prose gap-2">
      <RuledHeading>Mind</RuledHeading>
      <p>
        These are O-rings. A moulded tyre follows the classes of ISO 3302-1, which leaves precision sealing rings out:
        look up <Link to="/gauges/tolerances">what a moulder’s class means</Link>.
      </p>
      {use === "belt" ? (
        <p>
          As a belt a ring relaxes. Of the published advice: EPDM cured with peroxide relaxes least, polyurethane more;
          neoprene where there is heat or oil.
        </p>
      ) : use === "ring" ? (
        <p>
          The blue band is what usually serves in place of the old ring: 4 % smaller to 2 % larger inside (common
          practice, no source). An old ring has often grown; where its seat is at hand, measure that.
        </p>
      ) : (
        <p>
          The advice is for seals; that it serves for a tyre on its hub is common practice, no source. A ring that is to
          drive must not creep on its seat: rather more stretch than less.
        </p>
      )}
      <p>Rings have their own flash and ovality. Check on the machine before closing it up.</p>
    </section>
  );
}
