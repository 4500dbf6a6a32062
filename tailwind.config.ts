import type { Config } from "tailwindcss";

/** A colour token: its value, and how it flips at night, is in src/app/styles.css. */
const token = (name: string) => `var(--${name})`;

/**
 * The look as Tailwind names. Whole sections are replaced, not extended, so that
 * nothing but the look's own colours, type steps, corners and breakpoints exists.
 */
export default {
  content: [],
  theme: {
    colors: {
      transparent: "transparent",
      current: "currentColor",
      mist: token("mist"),
      float: token("float"),
      water: token("water"),
      "water-deep": token("water-deep"),
      "on-primary": token("on-primary"),
      ink: token("ink"),
      "ink-2": token("ink-2"),
      line: token("line"),
      leaf: token("leaf"),
      "leaf-ink": token("leaf-ink"),
      "leaf-soft": token("leaf-soft"),
      radicchio: token("radicchio"),
      "radicchio-soft": token("radicchio-soft"),
      awning: token("awning"),
      "awning-ink": token("awning-ink"),
      "awning-soft": token("awning-soft"),
      alarm: token("alarm"),
    },
    fontFamily: {
      display: ['"Fraunces"', '"Fraunces fallback"', "Georgia", "serif"],
      sans: ['"Atkinson Hyperlegible Next"', '"Atkinson fallback"', "Arial", "sans-serif"],
    },
    fontWeight: { normal: "400", semibold: "600" },
    // Steps of 15, 17, 20, 22, 32 and 44-60 px at a 16 px root; in rem so that larger text settings work.
    fontSize: {
      small: ["0.9375rem", { lineHeight: "1.4" }],
      base: ["1.0625rem", { lineHeight: "1.5" }],
      lead: ["1.25rem", { lineHeight: "1.45" }],
      title: ["1.375rem", { lineHeight: "1.15", letterSpacing: "-0.01em" }],
      head: ["2rem", { lineHeight: "1.1", letterSpacing: "-0.01em" }],
      hero: ["clamp(2.75rem, 1.9rem + 3.8vw, 3.75rem)", { lineHeight: "1.08", letterSpacing: "-0.01em" }],
    },
    borderRadius: { none: "0", card: "14px", full: "9999px" },
    boxShadow: {},
    dropShadow: {},
    screens: { table: "43.75rem", md: "48rem", lg: "75rem" },
    extend: {
      // touch: 44 px targets in the shop; stall: 60 px for wet thumbs.
      spacing: { touch: "2.75rem", stall: "3.75rem" },
      maxWidth: { page: "75rem", text: "36rem" },
    },
  },
} satisfies Config;
