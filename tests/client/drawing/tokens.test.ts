import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { colourNames } from "#shared/drawing/sceneStyle";
import { themeColours } from "#shared/drawing/themeColours";

const css = readFileSync("client/styles/tokens.css", "utf8");
const blocks = { light: css.split("@media")[0]!, dark: css.slice(css.indexOf(':root[data-theme="dark"]')) };

describe.each(["light", "dark"] as const)("drawings in mail and on the page, %s theme", (theme) => {
  it.each(colourNames)("share the colour of %s", (name) => {
    const value = blocks[theme].match(new RegExp(`--color-${name}: (#[0-9a-f]{6});`))?.[1];
    expect(value).toBe(themeColours[theme][name].toLowerCase());
  });
});
