import { useId, useState } from "react";
import { parseLength } from "#shared/domain/length";
import { type SizeUnit, sizeNumber } from "../../../lib/formatSize";

type Props = {
  /** Short, as it stands over the column; `words` say of which pulley. */
  label: string;
  words: string;
  mm: number;
  unit: SizeUnit;
  range: readonly [number, number];
  /** Whether it may be 0 or less: a place rather than a size. */
  isPlace?: boolean;
  onMm: (mm: number) => void;
};

type Read = { mm: number } | { problem: string };

/** A length, or a place: a length with a sign, or nothing at all. */
function read(text: string, unit: SizeUnit, isPlace: boolean, [least, most]: readonly [number, number]): Read {
  const tidy = text.trim().replace(/^[\u2212\u2013]/, "-");
  const isMinus = isPlace && tidy.startsWith("-");
  const size = isMinus ? tidy.slice(1).trim() : tidy;
  if (isPlace && /^0*[.,]?0*(?:\s*(?:mm|in))?$/.test(size) && size !== "") return { mm: 0 };
  const length = parseLength(size, unit);
  if (!length.ok) return { problem: length.problem };
  const mm = isMinus ? -length.mm : length.mm;
  return mm < least || mm > most ? { problem: `From ${least} to ${most} mm.` } : { mm };
}

const shown = (mm: number, unit: SizeUnit) => (mm === 0 ? "0" : sizeNumber(mm, unit, 0));

/** One number of a pulley, in any format that lengths have. It follows the board, except while it is being written. */
export function SizeCell({ label, words, mm, unit, range, isPlace = false, onMm }: Props) {
  const [draft, setDraft] = useState<string | null>(null);
  const id = useId();
  const result = draft === null ? { mm } : read(draft, unit, isPlace, range);
  const problem = "problem" in result ? result.problem : undefined;
  return (
    <div className="belt-cell">
      <span className="belt-label" aria-hidden="true">
        {label}
      </span>
      <input
        aria-label={words}
        className="input tabular-nums"
        value={draft ?? shown(mm, unit)}
        autoComplete="off"
        autoCapitalize="off"
        spellCheck={false}
        maxLength={40}
        aria-invalid={problem ? true : undefined}
        aria-describedby={problem ? `${id}-error` : undefined}
        onFocus={(event) => {
          setDraft(shown(mm, unit));
          event.currentTarget.select();
        }}
        onChange={(event) => {
          const text = event.target.value;
          setDraft(text);
          const next = read(text, unit, isPlace, range);
          if ("mm" in next) onMm(next.mm);
        }}
        onBlur={() => !problem && setDraft(null)}
      />
      {problem && (
        <p id={`${id}-error`} className="belt-cell-error">
          {problem}
        </p>
      )}
    </div>
  );
}
