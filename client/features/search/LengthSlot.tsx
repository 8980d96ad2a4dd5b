import { type CSSProperties, useState } from "react";
import { parseLength } from "#shared/domain/length";
import { type DimensionName, dimensionWords } from "#shared/domain/partKinds";
import type { SizeUnit } from "../../lib/formatSize";
import { DimensionLabel } from "../../ui/DimensionLabel";

export const slotId = (name: DimensionName): string => `strip-${name}`;

/** What was understood, where it says more than what was written. */
export function echoBeside(text: string, unit: SizeUnit): string {
  const written = text.trim();
  const read = written ? parseLength(written, unit) : undefined;
  if (!read?.ok || read.echo === written) return "";
  return read.echo.startsWith(`${written} `) ? read.echo.slice(written.length + 1) : read.echo;
}

type Props = {
  name: DimensionName;
  text: string;
  unit: SizeUnit;
  problem: string | undefined;
  example: string;
  onText: (text: string) => void;
  /** Takes the size out of the sentence; the primary one stays. */
  onRemove?: (() => void) | undefined;
};

/** One size in the sentence: its name, the length as one writes it, and what was understood. */
export function LengthSlot({ name, text, unit, problem, example, onText, onRemove }: Props) {
  const [isSettled, setSettled] = useState(false);
  const id = slotId(name);
  const shownProblem = isSettled ? problem : undefined;
  const echo = echoBeside(text, unit);
  const width = { "--slot-width": `${Math.max(text.length, example.length) + 1}ch` } as CSSProperties;
  return (
    <span className="inline-flex max-w-full flex-col align-baseline">
      <span>
        <label htmlFor={id} className="text-soft">
          <DimensionLabel name={name} />{" "}
        </label>
        <input
          id={id}
          name={name}
          type="text"
          value={text}
          placeholder={example}
          autoComplete="off"
          autoCapitalize="off"
          spellCheck={false}
          maxLength={60}
          className="slot slot-measured"
          style={width}
          aria-invalid={shownProblem ? true : undefined}
          aria-describedby={`${id}-echo${shownProblem ? ` ${id}-problem` : ""}`}
          onChange={(event) => onText(event.target.value)}
          onBlur={() => setSettled(true)}
          onInvalid={() => setSettled(true)}
        />
        <span id={`${id}-echo`} className="strip-echo">
          {echo}
        </span>
        {onRemove && (
          <button
            type="button"
            className="strip-remove"
            aria-label={`Leave out ${dimensionWords[name]}`}
            onClick={onRemove}
          >
            <svg width="10" height="10" viewBox="0 0 10 10" aria-hidden="true">
              <path d="M1 1L9 9M9 1L1 9" stroke="currentColor" strokeWidth="1.6" />
            </svg>
          </button>
        )}
      </span>
      {shownProblem && (
        <span id={`${id}-problem`} className="strip-problem">
          {shownProblem}
        </span>
      )}
    </span>
  );
}
