/**
 * Goods made to the buyer's specification carry no right of withdrawal.
 * Source: Directive 2011/83/EU, Article 16(c) (article number from memory).
 */
export function MadeToSize() {
  return (
    <p>
      <span className="border-b-2 border-metal font-semibold">Made to your size:</span> no withdrawal
    </p>
  );
}
