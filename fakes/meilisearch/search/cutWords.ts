/**
 * Text as the search compares it: marks and case removed, cut wherever there is neither letter nor digit.
 * "Körbchen, 44.5 mm" gives korbchen, 44, 5, mm.
 * Source: Meilisearch documentation, "Search", "Query term normalization". The service cuts words by language;
 * cutting at everything that is not a letter or digit is this fake's simpler way.
 */
export function cutWords(text: string): string[] {
  return (
    text
      .normalize("NFKD")
      .replace(/\p{Mn}/gu, "")
      .toLowerCase()
      .match(/[\p{L}\p{N}]+/gu) ?? []
  );
}
