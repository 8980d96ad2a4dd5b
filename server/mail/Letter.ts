/** A picture that the mail carries with it. `contentId` is what the HTML part calls it by. */
export type Picture = { contentId: string; png: Buffer; alt: string; width: number; height: number };

/** A part as a mail shows it: drawn, with its sizes and what it was bought for. */
export type LetterPart = {
  title: string;
  sizes: string;
  forNeed: string | null;
  notes: readonly string[];
  amount: string;
  picture: Picture | null;
};

export type Block =
  | { heading: string }
  | { paragraph: string }
  /** Lines that stay lines: an address. */
  | { lines: readonly string[] }
  | { facts: readonly (readonly [label: string, value: string])[] }
  | { part: LetterPart };

/** What a mail says, once; `letterHtml` and `letterText` are made from it, so that neither says more than the other. */
export type Letter = {
  subject: string;
  /** The facts first. */
  opening: readonly string[];
  action: { label: string; url: string } | null;
  blocks: readonly Block[];
  /** Why it was sent, in the last line. */
  why: string;
};

/** Text from outside on one line, so that it can neither break a header nor pretend to be another line of the mail. */
export const oneLine = (text: string): string =>
  text
    .replaceAll(/[\p{Cc}\p{Zl}\p{Zp}]+/gu, " ")
    .replaceAll(/\p{Cf}/gu, "")
    .trim();

export function picturesOf({ blocks }: Letter): Picture[] {
  return blocks.flatMap((block) => ("part" in block && block.part.picture ? [block.part.picture] : []));
}
