import { createElement, type ReactNode } from "react";

// React's types do not know MathML; browsers do.
const math =
  (tag: string) =>
  (...children: ReactNode[]) =>
    createElement(tag, null, ...children);
const row = math("mrow");
const fraction = math("mfrac");
const root = math("msqrt");
const power = math("msup");
const below = math("msub");
const name = math("mi");
const sign = math("mo");
const number = math("mn");
const words = math("mtext");

const over = (above: ReactNode, under: ReactNode) => fraction(row(above), row(under));
const squared = (what: ReactNode) => power(what, number("2"));
const phi = (limit: string) =>
  row(name("Φ"), sign("("), over(row(name(limit), sign("−"), name("y")), name("u")), sign(")"));

/** The chance that a size lies between L and U. */
export const ChanceFormula = () => (
  <Displayed label="P is Phi of (U minus y) over u, minus Phi of (L minus y) over u">
    {row(name("P"), sign("="), phi("U"), sign("−"), phi("L"))}
  </Displayed>
);

/** The two uncertainties in one. */
export const CombinedFormula = () => (
  <Displayed label="u is the square root of u need squared plus (t over root 3) squared">
    {row(
      name("u"),
      sign("="),
      root(
        squared(below(name("u"), words("need"))),
        sign("+"),
        squared(row(sign("("), over(name("t"), root(number("3"))), sign(")"))),
      ),
    )}
  </Displayed>
);

function Displayed({ label, children }: { label: string; children: ReactNode }) {
  return (
    <div className="overflow-x-auto py-1 text-step2">
      {createElement(
        "math",
        { display: "block", "aria-label": label, style: { textAlign: "left", marginInline: 0 } },
        children,
      )}
    </div>
  );
}
