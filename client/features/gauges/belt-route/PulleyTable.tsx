import { useCallback, useRef, useState } from "react";
import { type BeltRoute, beltRouteLimits } from "#shared/domain/beltRoute";
import { announce } from "../../../lib/announcements";
import type { SizeUnit } from "../../../lib/formatSize";
import { Button } from "../../../ui/Button";
import { RuledHeading } from "../../../ui/RuledHeading";
import { type NamedPulley, pulleyName } from "./beltState";
import { PulleyRow } from "./PulleyRow";
import { newPulley, withInserted, withMoved, withPulley } from "./pulleyEdits";

type Pulleys = readonly NamedPulley[];
type Props = {
  pulleys: Pulleys;
  route: BeltRoute | null;
  refusedIndex: number | null;
  unit: SizeUnit;
  selectedId: number | null;
  onSelect: (id: number) => void;
  onPulleys: (change: (now: Pulleys) => Pulleys) => void;
};
type Removed = { pulley: NamedPulley; index: number };

/** The pulleys in the order in which the belt comes by, each in numbers; what was removed can be put back. */
export function PulleyTable({ pulleys, route, refusedIndex, unit, selectedId, onSelect, onPulleys }: Props) {
  const [removed, setRemoved] = useState<Removed | null>(null);
  const latest = useRef({ pulleys, route });
  latest.current = { pulleys, route };

  const onChange = useCallback(
    (id: number, change: Partial<NamedPulley>) => onPulleys((now) => withPulley(now, id, change)),
    [onPulleys],
  );
  const onMove = useCallback(
    (id: number, by: 1 | -1) => {
      onPulleys((now) => withMoved(now, id, by));
      const place = latest.current.pulleys.findIndex((pulley) => pulley.id === id) + by + 1;
      announce(`Now number ${place} of ${latest.current.pulleys.length}`);
    },
    [onPulleys],
  );
  const onRemove = useCallback(
    (id: number) => {
      const index = latest.current.pulleys.findIndex((pulley) => pulley.id === id);
      const pulley = latest.current.pulleys[index];
      if (!pulley) return;
      setRemoved({ pulley, index });
      onPulleys((now) => now.filter((one) => one.id !== id));
      announce(`${pulleyName(pulley, index)} removed. It can be put back.`);
    },
    [onPulleys],
  );
  const add = () => {
    const { pulley, index } = newPulley(pulleys, route);
    onPulleys((now) => withInserted(now, pulley, index));
    onSelect(pulley.id);
    announce(`Pulley ${index + 1} added`);
  };
  const putBack = () => {
    if (!removed) return;
    onPulleys((now) => withInserted(now, removed.pulley, removed.index));
    setRemoved(null);
    announce(`${pulleyName(removed.pulley, removed.index)} is back`);
  };

  return (
    <section>
      <RuledHeading>Pulleys, in the order in which the belt comes by, {unit}</RuledHeading>
      <ol className="belt-rows">
        {pulleys.map((pulley, i) => (
          <PulleyRow
            key={pulley.id}
            pulley={pulley}
            index={i}
            count={pulleys.length}
            unit={unit}
            wrapDeg={route?.wrapsDeg[i] ?? null}
            spanMm={route?.spansMm[i] ?? null}
            turn={route?.contacts[i]?.turn ?? 1}
            isSelected={pulley.id === selectedId}
            isRefused={refusedIndex === i}
            onChange={onChange}
            onMove={onMove}
            onRemove={onRemove}
            onSelect={onSelect}
          />
        ))}
      </ol>
      <div className="mt-4 flex flex-wrap items-center gap-x-6 gap-y-2 print:hidden">
        <Button disabled={pulleys.length >= beltRouteLimits.pulleys[1]} onClick={add}>
          Add a pulley
        </Button>
        {removed && (
          <p>
            {pulleyName(removed.pulley, removed.index)} removed.{" "}
            <Button look="quiet" disabled={pulleys.length >= beltRouteLimits.pulleys[1]} onClick={putBack}>
              Put it back
            </Button>
          </p>
        )}
      </div>
    </section>
  );
}
