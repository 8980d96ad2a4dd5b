import type { PartPage } from "#shared/schemas/catalogue";
import { RuledHeading } from "../../ui/RuledHeading";
import { TraderDetails } from "../../ui/TraderDetails";

/** Who makes and sells it. */
export function TraderSection({ page }: { page: PartPage }) {
  return (
    <section>
      <RuledHeading className="mt-6">Made and sold by</RuledHeading>
      <TraderDetails trader={page.trader} />
    </section>
  );
}
