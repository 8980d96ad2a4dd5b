import type { Config } from "tailwindcss";

const colour = (name: string) => `var(--color-${name})`;
const colours = [
  "ground",
  "sheet",
  "ink",
  "soft",
  "rule",
  "edge",
  "measured",
  "on-measured",
  "measured-fill",
  "inband",
  "inband-fill",
  "outband",
  "rubber",
  "rubber-hatch",
  "metal",
  "metal-fill",
  "felt",
  "focus",
];

/** Names by what they mean; the values, light and dark, are the CSS variables in client/styles/tokens.css. */
export default {
  content: ["./index.html", "./client/**/*.{ts,tsx}"],
  theme: {
    colors: {
      transparent: "transparent",
      current: "currentColor",
      ...Object.fromEntries(colours.map((name) => [name, colour(name)])),
    },
    fontFamily: { sans: "var(--font-sans)" },
    // A scale of 1.2 from 16 px.
    fontSize: {
      small: ["0.8333rem", "1.25rem"],
      base: ["1rem", "1.5rem"],
      step1: ["1.2rem", "1.75rem"],
      step2: ["1.44rem", "1.75rem"],
      step3: ["1.728rem", "2.25rem"],
      step4: ["2.0736rem", "2.5rem"],
      step5: ["2.4883rem", "2.75rem"],
    },
    borderRadius: { none: "0", full: "9999px" },
    boxShadow: {},
    screens: { sm: "40rem", md: "52rem", lg: "68rem" },
    extend: { maxWidth: { prose: "65ch", page: "74rem" } },
  },
} satisfies Config;
