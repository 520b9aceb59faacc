import type { Config } from "tailwindcss";

/** The tokens of the look; each colour is a variable that light, dark and high contrast set in globals.css. */
const config: Config = {
  content: [],
  theme: {
    screens: { desk: "60rem" },
    colors: {
      transparent: "transparent",
      current: "currentColor",
      paper: "var(--paper)",
      ink: "var(--ink)",
      soft: "var(--soft)",
      hairline: "var(--hairline)",
      edge: "var(--edge)",
      wash: "var(--wash)",
      low: "var(--low)",
      range: "var(--range)",
      band: "var(--band)",
      high: "var(--high)",
      before: "var(--before)",
      focus: "var(--focus)",
      emergency: "var(--emergency)",
    },
    fontFamily: {
      sans: ["var(--font-text)", "system-ui", "sans-serif"],
      serif: ["var(--font-heading)", "Georgia", "serif"],
    },
    fontSize: {
      note: ["0.853rem", { lineHeight: "1.5" }],
      base: ["1rem", { lineHeight: "1.55" }],
      lead: ["1.1rem", { lineHeight: "1.55" }],
      section: ["1.235rem", { lineHeight: "1.3" }],
      page: ["clamp(1.7rem, 1.35rem + 1.5vw, 2.235rem)", { lineHeight: "1.15" }],
      front: ["clamp(2.1rem, 1.5rem + 2.8vw, 3rem)", { lineHeight: "1.1" }],
    },
    borderRadius: { none: "0", DEFAULT: "2px", full: "999px" },
    extend: {
      spacing: { rule: "2.176rem", "rule-phone": "0.882rem" },
      maxWidth: { text: "66ch", column: "52rem", margin: "15.5rem" },
      minHeight: { target: "2.824rem" },
    },
  },
};

export default config;
