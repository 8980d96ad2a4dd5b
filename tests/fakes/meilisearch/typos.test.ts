import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { defaultSettings } from "#fakes/meilisearch/Settings";
import { countTypos } from "#fakes/meilisearch/search/countTypos";
import { cutWords } from "#fakes/meilisearch/search/cutWords";
import { readQuery } from "#fakes/meilisearch/search/readQuery";

const typo = defaultSettings.typoTolerance;

describe("typing errors between a query word and a word", () => {
  it.each<[query: string, word: string, most: number, prefix: boolean, typos: number | null]>([
    // The cases the documentation gives for one word.
    ["saturday", "saturday", 1, false, 0],
    ["satuday", "saturday", 1, false, 1],
    ["sutuday", "saturday", 1, false, null],
    ["caturday", "saturday", 1, false, null],
    ["caturday", "saturday", 2, false, 2],
    ["phnoe", "phone", 1, false, 1],
    ["sevem", "seven", 1, false, 1],
    ["tow", "two", 0, false, null],
    // One letter too many, too few, wrong, swapped.
    ["pulleyy", "pulley", 1, false, 1],
    ["puley", "pulley", 1, false, 1],
    ["pullez", "pulley", 1, false, 1],
    ["pullye", "pulley", 1, false, 1],
    ["upleys", "pulleys", 2, false, null],
    ["capstn", "capstans", 1, false, null],
    ["capstanns", "capstans", 2, false, 1],
    ["cpastnas", "capstans", 2, false, 2],
    // The last word may go on.
    ["caps", "capstan", 0, true, 0],
    ["caps", "capstan", 0, false, null],
    ["captsa", "capstans", 1, true, 1],
    ["capta", "capstan", 1, true, 1],
    ["xapst", "capstan", 1, true, null],
    ["capstans", "caps", 1, true, null],
    ["", "any", 0, true, 0],
  ])("%s / %s, at most %i, prefix %s: %s", (query, word, most, prefix, typos) => {
    expect(countTypos(query, word, most, prefix)).toBe(typos);
  });

  it("takes one changed letter after the first as one error, wherever it is", () => {
    const word = fc.string({ unit: fc.constantFrom(..."abcdefgh"), minLength: 5, maxLength: 12 });
    fc.assert(
      fc.property(word, fc.nat(), (text, at) => {
        const i = 1 + (at % (text.length - 1));
        const changed = `${text.slice(0, i)}z${text.slice(i + 1)}`;
        expect(countTypos(changed, text, 2, false)).toBe(1);
      }),
      { seed: 7 },
    );
  });
});

describe("a query", () => {
  const forgiven = (q: string, settings = typo) =>
    readQuery(q, settings).terms.map((term) => [term.words[0], term.typos]);

  it("forgives one error from five letters on and two from nine", () => {
    expect(forgiven("belt belts pulley eightlet ninelette")).toEqual([
      ["belt", 0],
      ["belts", 1],
      ["pulley", 1],
      ["eightlet", 1],
      ["ninelette", 2],
    ]);
  });

  it("forgives as the settings say", () => {
    expect(forgiven("belt", { ...typo, minWordSizeForTypos: { oneTypo: 4, twoTypos: 10 } })).toEqual([["belt", 1]]);
    expect(forgiven("pulley", { ...typo, enabled: false })).toEqual([["pulley", 0]]);
    expect(forgiven("Pulley idler", { ...typo, disableOnWords: ["pulley"] })).toEqual([
      ["pulley", 0],
      ["idler", 1],
    ]);
    expect(forgiven("12345", { ...typo, disableOnNumbers: true })).toEqual([["12345", 0]]);
  });

  it("is cut into words, phrases and what to leave out", () => {
    const { terms, excluded } = readQuery('Körbchen 44.5 "two words" -belt -"old stock" anti-static', typo);
    expect(terms.map(({ words, phrase, prefix }) => [words.join(" "), phrase, prefix])).toEqual([
      ["korbchen", false, false],
      ["44", false, false],
      ["5", false, false],
      ["two words", true, false],
      ["anti", false, false],
      ["static", false, true],
    ]);
    expect(excluded.map(({ words }) => words.join(" "))).toEqual(["belt", "old stock"]);
  });

  it("leaves the last word open only while it is being typed, and reads ten words at most", () => {
    const open = (q: string) => readQuery(q, typo).terms.map(({ prefix }) => prefix);
    expect(open("idler whe")).toEqual([false, true]);
    expect(open("idler whe ")).toEqual([false, false]);
    expect(open('idler "whe"')).toEqual([false, false]);
    expect(open("idler -whe")).toEqual([false]);
    expect(open("a b c d e f g h i j k l")).toEqual(Array(10).fill(false));
    expect(readQuery("", typo)).toEqual({ terms: [], excluded: [] });
  });
});

it("words lose case and marks and end at anything that is no letter or digit", () => {
  expect(cutWords("Körbchen, Ø44.5 mm (N°3)")).toEqual(["korbchen", "ø44", "5", "mm", "n", "3"]);
});
