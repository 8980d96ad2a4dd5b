import type { ColourName } from "./sceneStyle";

export type DrawingTheme = "light" | "dark";

/** The product's drawing colours as values, for pictures that leave the page: mail, paper, downloads. */
export const themeColours: Record<DrawingTheme, Record<ColourName, string>> = {
  light: {
    sheet: "#F8FAF9",
    ink: "#16202E",
    soft: "#44515E",
    measured: "#1846C9",
    rubber: "#23282D",
    "rubber-hatch": "#87929C",
    metal: "#9A6B12",
    "metal-fill": "#E9D6A6",
    felt: "#D3D8C6",
  },
  dark: {
    sheet: "#141E29",
    ink: "#E6EEF0",
    soft: "#A9B9C2",
    measured: "#8FB0FF",
    rubber: "#05090D",
    "rubber-hatch": "#76858F",
    metal: "#D9AE55",
    "metal-fill": "#47391B",
    felt: "#46503F",
  },
};
