import { z } from "zod";
import { ApiError, type ErrorCode } from "./ApiError";

const Attributes = z.array(z.string());

const FilterableAttribute = z.union([
  z.string(),
  z.strictObject({
    attributePatterns: Attributes,
    features: z
      .strictObject({
        facetSearch: z.boolean().default(false),
        filter: z
          .strictObject({ equality: z.boolean().default(true), comparison: z.boolean().default(false) })
          .prefault({}),
      })
      .prefault({}),
  }),
]);
export type FilterableAttribute = z.infer<typeof FilterableAttribute>;

const BUILT_IN_RULES = [
  "words",
  "typo",
  "proximity",
  "attribute",
  "attributeRank",
  "sort",
  "wordPosition",
  "exactness",
];

const RankingRules = Attributes.superRefine((rules, context) => {
  for (const rule of rules) {
    if (BUILT_IN_RULES.includes(rule) || /^[^:]+:(asc|desc)$/.test(rule)) continue;
    const message = `\`${rule}\` ranking rule is invalid. Valid ranking rules are ${BUILT_IN_RULES.join(", ")} and custom ranking rules.`;
    context.addIssue({ code: "custom", message });
  }
  if (rules.includes("attribute") && (rules.includes("attributeRank") || rules.includes("wordPosition"))) {
    context.addIssue({ code: "custom", message: "`attribute` cannot be used with `attributeRank` or `wordPosition`." });
  }
});

const count = (most: number) => z.int().min(0).max(most).nullable().optional();

const TypoTolerance = z.strictObject({
  enabled: z.boolean().nullable().optional(),
  minWordSizeForTypos: z
    .strictObject({ oneTypo: count(255), twoTypos: count(255) })
    .nullable()
    .optional(),
  disableOnWords: Attributes.nullable().optional(),
  disableOnAttributes: Attributes.nullable().optional(),
  disableOnNumbers: z.boolean().nullable().optional(),
});

/** What a settings request may hold: any of these, or null for the default of that one. */
const fields = {
  displayedAttributes: Attributes,
  searchableAttributes: Attributes,
  filterableAttributes: z.array(FilterableAttribute),
  sortableAttributes: Attributes,
  rankingRules: RankingRules,
  typoTolerance: TypoTolerance,
  pagination: z.strictObject({ maxTotalHits: z.int().min(0).nullable().optional() }),
};

export type SettingName = keyof typeof fields;
export const settingNames = Object.keys(fields) as SettingName[];

export type Settings = {
  displayedAttributes: string[];
  /** In order of importance; "*" is every field, in the order documents have them. */
  searchableAttributes: string[];
  filterableAttributes: FilterableAttribute[];
  sortableAttributes: string[];
  rankingRules: string[];
  typoTolerance: {
    enabled: boolean;
    /** Characters from which a word may be one typo, or two, away. */
    minWordSizeForTypos: { oneTypo: number; twoTypos: number };
    disableOnWords: string[];
    disableOnAttributes: string[];
    disableOnNumbers: boolean;
  };
  pagination: { maxTotalHits: number };
};

/** Source: Meilisearch documentation, "Settings" (defaults), "Built-in ranking rules", "Typo tolerance settings". */
export const defaultSettings: Settings = {
  displayedAttributes: ["*"],
  searchableAttributes: ["*"],
  filterableAttributes: [],
  sortableAttributes: [],
  rankingRules: ["words", "typo", "proximity", "attributeRank", "sort", "wordPosition", "exactness"],
  typoTolerance: {
    enabled: true,
    minWordSizeForTypos: { oneTypo: 5, twoTypos: 9 },
    disableOnWords: [],
    disableOnAttributes: [],
    disableOnNumbers: false,
  },
  pagination: { maxTotalHits: 1000 },
};

export type SettingsPatch = { [Name in SettingName]?: z.infer<(typeof fields)[Name]> | null };

/**
 * Reads a settings request.
 * Errors: bad_request for a setting this fake does not know (the service knows more), else the setting's own code.
 */
export function readSettingsPatch(body: unknown): SettingsPatch {
  const shape = z.record(z.string(), z.unknown()).safeParse(body);
  if (!shape.success) throw new ApiError("bad_request", "Invalid value type: expected an object");
  const patch: Record<string, unknown> = {};
  for (const [name, value] of Object.entries(shape.data)) {
    if (!isSettingName(name)) {
      const expected = settingNames.map((known) => `\`${known}\``).join(", ");
      throw new ApiError("bad_request", `Unknown field \`${name}\`: expected one of ${expected}`);
    }
    patch[name] = value === null ? null : readSetting(name, value);
  }
  return patch;
}

const isSettingName = (name: string): name is SettingName => Object.hasOwn(fields, name);

function readSetting(name: SettingName, value: unknown): unknown {
  const read = fields[name].safeParse(value);
  if (read.success) return read.data;
  const [issue] = read.error.issues;
  const place = [name, ...(issue?.path ?? [])].join(".");
  throw new ApiError(settingCode(name), `Invalid value at \`.${place}\`: ${issue?.message ?? "not valid"}`);
}

const settingCode = (name: SettingName): ErrorCode =>
  `invalid_settings_${name.replace(/[A-Z]/g, (c) => `_${c.toLowerCase()}`)}` as ErrorCode;

/**
 * Settings after a request: lists are replaced, objects filled in, null goes back to the default.
 * Errors: invalid_settings_typo_tolerance unless 0 <= oneTypo <= twoTypos.
 */
export function applySettings(settings: Settings, patch: SettingsPatch): Settings {
  const { typoTolerance: typo, pagination, ...lists } = patch;
  const next: Settings = { ...settings };
  for (const [name, value] of Object.entries(lists)) {
    Object.assign(next, { [name]: value ?? defaultSettings[name as keyof typeof lists] });
  }
  if (pagination !== undefined) next.pagination = fill(settings.pagination, pagination, defaultSettings.pagination);
  if (typo !== undefined) {
    const { minWordSizeForTypos: sizes, ...rest } = typo ?? {};
    const current = typo === null ? defaultSettings.typoTolerance : settings.typoTolerance;
    const filled = fill(current, rest, defaultSettings.typoTolerance);
    const defaults = defaultSettings.typoTolerance.minWordSizeForTypos;
    filled.minWordSizeForTypos =
      sizes === undefined ? current.minWordSizeForTypos : fill(current.minWordSizeForTypos, sizes, defaults);
    const { oneTypo, twoTypos } = filled.minWordSizeForTypos;
    if (oneTypo > twoTypos) {
      const message =
        "`minWordSizeForTypos` setting is invalid. `oneTypo` and `twoTypos` fields should be between `0` and `255`, and `twoTypos` should be greater or equals to `oneTypo`";
      throw new ApiError(
        "invalid_settings_typo_tolerance",
        `${message} but found \`oneTypo: ${oneTypo}\` and \`twoTypos: ${twoTypos}\`.`,
      );
    }
    next.typoTolerance = filled;
  }
  return next;
}

function fill<T extends object>(current: T, patch: { [K in keyof T]?: unknown } | null, defaults: T): T {
  if (patch === null) return { ...defaults };
  const given = Object.entries(patch).filter(([, value]) => value !== undefined);
  return Object.assign(
    { ...current },
    Object.fromEntries(given.map(([key, value]) => [key, value ?? defaults[key as keyof T]])),
  );
}
