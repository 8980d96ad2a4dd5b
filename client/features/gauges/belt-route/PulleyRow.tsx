import { memo } from "react";
import { type BeltWrap, beltRouteLimits } from "#shared/domain/beltRoute";
import { roundedSize, type SizeUnit } from "../../../lib/formatSize";
import { Button } from "../../../ui/Button";
import { longestName } from "./beltCodec";
import { type NamedPulley, pulleyName } from "./beltState";
import { SizeCell } from "./SizeCell";
import { turnArrow } from "./turnArrow";

type Props = {
  pulley: NamedPulley;
  index: number;
  count: number;
  unit: SizeUnit;
  wrapDeg: number | null;
  spanMm: number | null;
  turn: 1 | -1;
  isSelected: boolean;
  isRefused: boolean;
  onChange: (id: number, change: Partial<NamedPulley>) => void;
  onMove: (id: number, by: 1 | -1) => void;
  onRemove: (id: number) => void;
  onSelect: (id: number) => void;
};

const { place, diameter, pulleys: counts } = beltRouteLimits;

/** One pulley in numbers: where it is, which side of the belt lies on it, and what follows. */
export const PulleyRow = memo(function PulleyRow(props: Props) {
  const { pulley, index, count, unit, wrapDeg, spanMm, turn, isSelected, isRefused } = props;
  const { onChange, onMove, onRemove, onSelect } = props;
  const { id, name, x, y, wrap } = pulley;
  const called = pulleyName(pulley, index);
  const size = (part: "x" | "y" | "diameter", label: string, words: string) => (
    <SizeCell
      label={label}
      words={`${words} of ${called}, ${unit}`}
      mm={{ x, y, diameter: pulley.diameter }[part]}
      unit={unit}
      range={part === "diameter" ? diameter : place}
      isPlace={part !== "diameter"}
      onMm={(mm) => onChange(id, { [part]: mm })}
    />
  );
  return (
    <li
      className="belt-row"
      data-lit={isSelected || undefined}
      data-refused={isRefused || undefined}
      onFocus={() => onSelect(id)}
    >
      <span className="belt-number">{index + 1}</span>
      <div className="belt-cell belt-name">
        <span className="belt-label" aria-hidden="true">
          pulley
        </span>
        <input
          aria-label={`Name of pulley ${index + 1}`}
          name={`pulley-${id}`}
          className="input font-semibold"
          value={name}
          placeholder={`Pulley ${index + 1}`}
          maxLength={longestName}
          autoComplete="off"
          onChange={(event) => onChange(id, { name: event.target.value })}
        />
      </div>
      {size("x", "x", "x")}
      {size("y", "y", "y")}
      {size("diameter", "ø", "Diameter")}
      <div className="belt-cell belt-side">
        <span className="belt-label" aria-hidden="true">
          side
        </span>
        <select
          aria-label={`Side of the belt on ${called}`}
          name={`side-${id}`}
          className="input"
          value={wrap}
          onChange={(event) => onChange(id, { wrap: event.target.value as BeltWrap })}
        >
          <option value="inside">inside</option>
          <option value="back">back</option>
        </select>
      </div>
      <p className="belt-value">
        <span className="belt-label">wrap</span>
        {wrapDeg === null ? "–" : `${wrapDeg.toFixed(1)}°`}
      </p>
      <p className="belt-value">
        <span className="belt-label">turns</span>
        {wrapDeg !== null && (
          <svg width={17} height={17} viewBox="-10 -10 20 20" aria-hidden="true" className="inline-block align-middle">
            <path d={turnArrow(6.5, 90, 250, turn)} fill="none" stroke="currentColor" strokeWidth={1.8} />
          </svg>
        )}{" "}
        {wrap === "inside" ? "same" : "opposite"}
      </p>
      <p className="belt-value">
        <span className="belt-label">to next</span>
        {spanMm === null ? "–" : roundedSize(spanMm, unit)}
      </p>
      <div className="belt-tools">
        <Button look="quiet" disabled={index === 0} aria-label={`${called} earlier`} onClick={() => onMove(id, -1)}>
          up
        </Button>
        <Button
          look="quiet"
          disabled={index === count - 1}
          aria-label={`${called} later`}
          onClick={() => onMove(id, 1)}
        >
          down
        </Button>
        <Button look="quiet" disabled={count <= counts[0]} aria-label={`Remove ${called}`} onClick={() => onRemove(id)}>
          remove
        </Button>
      </div>
    </li>
  );
});
