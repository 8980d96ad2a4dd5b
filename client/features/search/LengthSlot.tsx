import { type CSSProperties, useRef, useState } from "react";
import { flushSync } from "react-dom";
import type { ParsedSize } from "#shared/domain/parseSize";
import { type DimensionName, dimensionWords } from "#shared/domain/partKinds";
import { isWorkedOut, sizeLimits } from "#shared/domain/writtenSize";
import { DimensionLabel } from "../../ui/DimensionLabel";

export const slotId = (name: DimensionName): string => `strip-${name}`;
const workedOut = "worked out as ";

/** What was understood, where it says more than what was written; and whether another reading can follow. */
function understood(text: string, size: ParsedSize | undefined): { echo: string; canGoOn: boolean } {
  const written = text.trim();
  if (!size?.ok) return { echo: "", canGoOn: false };
  const whole = size.echo.replace(workedOut, "");
  const echo = whole.startsWith(`${written} `) ? whole.slice(written.length + 1) : whole;
  return {
    echo: echo === written ? "" : echo,
    canGoOn: "readingsMm" in size && size.readingsMm.length < sizeLimits.readings && !written.endsWith(";"),
  };
}

type Props = {
  name: DimensionName;
  text: string;
  /** What was understood of it; undefined where nothing is written, or what reads it is still on its way. */
  size: ParsedSize | undefined;
  problem: string | undefined;
  /** Not searched as it stands. */
  isLeftOut: boolean;
  example: string;
  /** Whether an instrument was put to a part; else only what was worked out can be written. */
  isMeasured: boolean;
  onText: (text: string) => void;
  /** Takes the size out of the sentence; the primary one stays. */
  onRemove?: (() => void) | undefined;
};

/** One size in the sentence: its name, the length as one writes it, and what was understood. */
export function LengthSlot(props: Props) {
  const { name, text, size, problem, isLeftOut, example, isMeasured, onText, onRemove } = props;
  // What is wrong from the start came with the address, and is not being written.
  const [isSettled, setSettled] = useState(problem !== undefined);
  const input = useRef<HTMLInputElement>(null);
  const id = slotId(name);
  const shownProblem = isSettled ? problem : undefined;
  const { echo, canGoOn } = understood(text, size);
  const note =
    shownProblem ?? (isLeftOut ? `Not searched until a ± says how far it may be off, as in ${example}.` : undefined);
  const width = { "--slot-width": `${Math.max(text.length, example.length) + 1}ch` } as CSSProperties;

  const goOn = () => {
    const longer = `${text.trim()}; `;
    flushSync(() => onText(longer));
    input.current?.focus();
    input.current?.setSelectionRange(longer.length, longer.length);
  };

  return (
    <span className={note ? "strip-size-noted" : "strip-size"}>
      <span>
        <label htmlFor={id} className="text-soft">
          <DimensionLabel name={name} />
          {"\u00a0"}
        </label>
        {(!isMeasured || isWorkedOut(text)) && workedOut}
        <input
          ref={input}
          id={id}
          name={name}
          type="text"
          value={text}
          placeholder={example}
          autoComplete="off"
          autoCapitalize="off"
          spellCheck={false}
          maxLength={sizeLimits.characters}
          className="slot slot-measured"
          style={width}
          aria-invalid={shownProblem ? true : undefined}
          aria-describedby={`${id}-echo${note ? ` ${id}-note` : ""}`}
          onChange={(event) => onText(event.target.value)}
          onBlur={() => setSettled(true)}
          onInvalid={() => setSettled(true)}
        />
        <span id={`${id}-echo`} className="strip-echo">
          {echo}
        </span>
        {canGoOn && isMeasured && (
          <button
            type="button"
            className={`strip-more ${onRemove ? "strip-more-late" : ""}`}
            // The field keeps the focus, and with it this button stays in sight until it is let go.
            onMouseDown={(event) => event.preventDefault()}
            onClick={goOn}
          >
            + reading <span className="sr-only">of the {dimensionWords[name]}</span>
          </button>
        )}
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
      {note && (
        <span id={`${id}-note`} className={`strip-note ${shownProblem ? "strip-problem" : ""}`}>
          {note}
        </span>
      )}
    </span>
  );
}
