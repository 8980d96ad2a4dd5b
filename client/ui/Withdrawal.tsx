/**
 * Days in which a buyer may withdraw, counted from the day on which the last of several goods is in their hands.
 * Source: Directive 2011/83/EU on consumer rights, Article 9(1) and 9(2)(b)(i).
 */
export const withdrawalDays = 14;

type Props = {
  /** Whether any part is made to the buyer's size, and whether every part is. */ made: "none" | "some" | "all";
};

/** The right of withdrawal, in words. */
export function Withdrawal({ made }: Props) {
  const exception = "Parts made to your size are excepted: what is made for one need cannot be sold to another.";
  return (
    <div className="grid max-w-prose gap-2">
      {made !== "all" && (
        <p>
          Consumers may withdraw from the purchase without giving a reason until {withdrawalDays} days after the last
          parcel is in their hands: tell the workshop, by mail or letter, and send the parts back.
        </p>
      )}
      {made !== "none" && <p>{exception}</p>}
      <p className="text-soft">A part that does not conform to what was stated is put right in any case.</p>
    </div>
  );
}

/** Which of these lines are made to the buyer's size. */
export function madeOf(lines: readonly { madeToSize: boolean }[]): Props["made"] {
  const made = lines.filter(({ madeToSize }) => madeToSize).length;
  if (made === 0) return "none";
  return made === lines.length ? "all" : "some";
}
