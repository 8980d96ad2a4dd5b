import type { ReactNode } from "react";
import { parseLength } from "#shared/domain/length";
import type { SizeUnit } from "../../lib/formatSize";
import { TextField } from "../../ui/TextField";

type Props = {
  name: string;
  label: ReactNode;
  /** As written, in any format that `parseLength` reads. */
  text: string;
  unit: SizeUnit;
  onText: (text: string) => void;
  hint?: ReactNode;
  /** What the computation found wrong; what the writing has wrong comes before it. */
  error?: string | undefined;
  optional?: boolean;
};

/** What was understood of a length, where it says more than what was written. */
export function echoOf(text: string, unit: SizeUnit): string | undefined {
  const written = text.trim();
  const read = written ? parseLength(written, unit) : undefined;
  if (!read?.ok || read.echo === written || read.echo === `${written} ${unit}`) return undefined;
  return read.echo;
}

/** A length in words of one's own: "44.1", "1-47/64 in". What was understood stands below it. */
export function LengthField({ name, label, text, unit, onText, hint, error, optional }: Props) {
  const read = text.trim() ? parseLength(text, unit) : undefined;
  const problem = read && !read.ok ? read.problem : error;
  return (
    <TextField
      name={name}
      label={label}
      value={text}
      onChange={(event) => onText(event.target.value)}
      inputMode="text"
      autoComplete="off"
      autoCapitalize="off"
      spellCheck={false}
      maxLength={60}
      className="tabular-nums"
      hint={problem ? hint : (echoOf(text, unit) ?? hint)}
      {...(problem === undefined ? {} : { error: problem })}
      {...(optional === undefined ? {} : { optional })}
    />
  );
}
