import { type DimensionName, dimensionWords } from "#shared/domain/partKinds";

const circles: readonly DimensionName[] = ["outsideDiameter"];

/** The diameter sign, drawn because few fonts have it. */
function DiameterSign() {
  return (
    <svg width="0.78em" height="0.78em" viewBox="0 0 16 16" className="inline-block align-[-0.04em]" aria-hidden="true">
      <circle cx="8" cy="8" r="5.6" fill="none" stroke="currentColor" strokeWidth="1.5" />
      <path d="M1.5 14.5L14.5 1.5" stroke="currentColor" strokeWidth="1.5" />
    </svg>
  );
}

/** A dimension's name; a wheel's own diameter by its sign. */
export function DimensionLabel({ name }: { name: DimensionName }) {
  if (!circles.includes(name)) return dimensionWords[name];
  return (
    <>
      <DiameterSign />
      <span className="sr-only">{dimensionWords[name]}</span>
    </>
  );
}
