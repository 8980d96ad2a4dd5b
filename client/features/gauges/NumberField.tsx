import type { ReactNode } from "react";
import { TextField } from "../../ui/TextField";
import { readPlainNumber } from "./readPlainNumber";

type Props = {
  name: string;
  label: ReactNode;
  text: string;
  onText: (text: string) => void;
  hint?: ReactNode;
  error?: string | undefined;
};

/** A number that is not a length: percent, hertz, a count. Comma or point. */
export function NumberField({ name, label, text, onText, hint, error }: Props) {
  const problem = text.trim() !== "" && readPlainNumber(text) === null ? "Write a number, like 3.5." : error;
  return (
    <TextField
      name={name}
      label={label}
      value={text}
      onChange={(event) => onText(event.target.value)}
      inputMode="decimal"
      autoComplete="off"
      maxLength={20}
      className="tabular-nums"
      hint={hint}
      {...(problem === undefined ? {} : { error: problem })}
    />
  );
}
