/** ISO 216 A4, and US Letter (8.5 x 11 in). */
export const papers = {
  a4: { name: "A4", widthMm: 210, heightMm: 297 },
  letter: { name: "US Letter", widthMm: 215.9, heightMm: 279.4 },
} as const;
export type Paper = keyof typeof papers;

/** What many printers cannot reach, and a little more. */
export const marginMm = 10;
