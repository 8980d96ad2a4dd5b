const names = new Intl.DisplayNames(["en"], { type: "region", fallback: "code" });

/** The English name of a country by its ISO 3166-1 alpha-2 code; the code itself where it is none. */
export function countryName(code: string): string {
  try {
    return names.of(code) ?? code;
  } catch {
    return code;
  }
}
