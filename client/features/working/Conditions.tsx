import { conditionFacts, conditions } from "#shared/domain/conditions";

/** The conditions of an old part and how to tell them. */
export function Conditions() {
  return (
    <dl className="grid max-w-prose gap-x-6 gap-y-1 sm:grid-cols-[8rem_1fr]">
      {conditions.map((condition) => (
        <div key={condition} className="contents">
          <dt className="font-semibold">{conditionFacts[condition].name}</dt>
          <dd>{conditionFacts[condition].sign}</dd>
        </div>
      ))}
    </dl>
  );
}
