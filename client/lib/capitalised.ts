/** The same words with a capital first letter. */
export const capitalised = (words: string): string => words.charAt(0).toUpperCase() + words.slice(1);
