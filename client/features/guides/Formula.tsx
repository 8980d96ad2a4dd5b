import type { ReactNode } from "react";

function Fraction({ over, under }: { over: ReactNode; under: ReactNode }) {
  return (
    <span className="mx-1 inline-grid text-center align-middle leading-tight">
      <span className="border-b border-ink px-1">{over}</span>
      <span className="px-1">{under}</span>
    </span>
  );
}

function Phi({ limit }: { limit: string }) {
  return (
    <span className="whitespace-nowrap">
      Φ<span className="align-middle text-step4 font-extralight">(</span>
      <Fraction
        over={
          <>
            <i>{limit}</i> − <i>y</i>
          </>
        }
        under={<i>u</i>}
      />
      <span className="align-middle text-step4 font-extralight">)</span>
    </span>
  );
}

/** The two uncertainties in one. */
export const CombinedFormula = () => (
  <Displayed label="u squared is u need squared plus t squared over 3">
    <i>u</i>
    <sup>2</sup> = <i>u</i>
    <sub>need</sub>
    <sup>2</sup> +{" "}
    <Fraction
      over={
        <>
          <i>t</i>
          <sup>2</sup>
        </>
      }
      under="3"
    />
  </Displayed>
);

/** The chance that a size lies between L and U. */
export const ChanceFormula = () => (
  <Displayed label="P is Phi of U minus y over u, less Phi of L minus y over u">
    <i>P</i> = <Phi limit="U" /> − <Phi limit="L" />
  </Displayed>
);

function Displayed({ label, children }: { label: string; children: ReactNode }) {
  return (
    <div role="math" aria-label={label} className="py-1 text-step2">
      {children}
    </div>
  );
}
