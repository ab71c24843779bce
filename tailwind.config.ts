import type { Config } from "tailwindcss";

/** Names only. The values of every token, by day and on night shift, are in app/styles/tokens.css. */
const token = (name: string) => `var(--${name})`;

const colours = [
  "ground", "sheet", "well", "tag", "tag-ring", "ink", "ink-2", "ink-3", "line", "edge",
  "copper", "copper-press", "copper-edge", "on-copper", "copper-text", "copper-tint",
  "blue", "blue-tint", "green", "green-tint", "rust", "rust-tint", "amber", "amber-fill", "amber-tint",
  "band", "band-2", "on-band", "on-band-2", "band-edge", "copper-band", "blue-band", "amber-band", "rust-band",
]; // prettier-ignore

export default {
  content: ["./app/**/*.{ts,tsx}", "./components/**/*.{ts,tsx}"],
  theme: {
    colors: {
      transparent: "transparent",
      current: "currentColor",
      ...Object.fromEntries(colours.map((name) => [name, token(name)])),
    },
    fontFamily: { head: token("head"), body: token("body"), mono: token("mono") },
    fontSize: {
      xs: token("t-xs"), sm: token("t-sm"), md: token("t-md"), lg: token("t-lg"),
      xl: token("t-xl"), "2xl": token("t-2xl"), "3xl": token("t-3xl"), "4xl": token("t-4xl"),
    }, // prettier-ignore
    borderRadius: {
      none: "0",
      sheet: token("r-sheet"),
      field: token("r-field"),
      button: token("r-button"),
      full: "9999px",
    },
    screens: { tablet: "720px", desk: "1080px" },
  },
} satisfies Config;
