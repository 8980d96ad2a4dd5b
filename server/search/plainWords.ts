/** Letters that do not come apart into a base and a mark, as they are typed without the key for them. */
const plainLetters: Record<string, string> = {
  ß: "ss",
  æ: "ae",
  œ: "oe",
  ø: "o",
  ł: "l",
  đ: "d",
  ð: "d",
  þ: "th",
  ı: "i",
};

/**
 * The words of a text as they are compared: lower case, without accents, numbers with their decimals kept whole.
 * "Pinch-roller, Ø 9,5 mm" gives ["pinch", "roller", "o", "9.5", "mm"].
 */
export function plainWords(text: string): string[] {
  const plain = text
    .normalize("NFKD")
    .replace(/\p{M}/gu, "")
    .toLowerCase()
    .replace(/[ßæœøłđðþı]/g, (letter) => plainLetters[letter] ?? letter);
  return (plain.match(/\d+(?:[.,]\d+)+|[\p{L}\p{N}]+/gu) ?? []).map((word) => word.replaceAll(",", "."));
}
