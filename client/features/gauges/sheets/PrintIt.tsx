import { buttonClass } from "../../../ui/Button";
import { RuledHeading } from "../../../ui/RuledHeading";

/** Opens the PDF, where there is one, and says how its print is checked before it is trusted. */
export function PrintIt({ href }: { href: string | null }) {
  return (
    <section className="grid justify-items-start gap-3">
      <RuledHeading className="w-full">Print it</RuledHeading>
      {href === null ? (
        <p className="font-semibold text-outband">Nothing to print until the sheet is mended.</p>
      ) : (
        <a href={href} target="_blank" rel="noopener" className={buttonClass("primary", "print:hidden")}>
          Open the PDF
        </a>
      )}
      <ol className="grid list-decimal gap-1 pl-6">
        <li>Print at 100 % (“actual size”), with no fit to page.</li>
        <li>Measure the black bars with a calliper, across and up the page: 100 mm and 4 in from end to end.</li>
        <li>If a bar is off, the whole sheet is off: do not trust it, print again.</li>
      </ol>
    </section>
  );
}
