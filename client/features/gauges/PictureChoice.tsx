import type { ReactNode } from "react";

type Choice<T> = { value: T; name: string; words: string; picture: ReactNode };
type Props<T extends string> = {
  legend: string;
  name: string;
  value: T;
  choices: readonly Choice<T>[];
  onChoose: (value: T) => void;
  /** Classes of the grid: how many stand in a row. */
  columns: string;
  /** On a phone the picture stands beside its words instead of above them. */
  isListOnPhone?: boolean;
};

/** One of a few, chosen by its drawing. On paper only the chosen one is left. */
export function PictureChoice<T extends string>(props: Props<T>) {
  const { legend, name, value, choices, onChoose, columns, isListOnPhone = false } = props;
  return (
    <fieldset className="mb-4">
      <legend className="sr-only">{legend}</legend>
      <div className={`grid gap-2 ${columns}`}>
        {choices.map((choice) => {
          const isChosen = choice.value === value;
          return (
            <label
              key={choice.value}
              className={`picture-choice ${isListOnPhone ? "picture-choice-list" : ""} ${isChosen ? "" : "print:hidden"}`}
            >
              <input
                type="radio"
                name={name}
                value={choice.value}
                checked={isChosen}
                onChange={() => onChoose(choice.value)}
                className="sr-only"
              />
              <span aria-hidden="true">{choice.picture}</span>
              <span className="grid">
                <span className={isChosen ? "font-bold text-measured" : "font-semibold"}>{choice.name}</span>
                <span className="text-small text-soft">{choice.words}</span>
              </span>
            </label>
          );
        })}
      </div>
    </fieldset>
  );
}
