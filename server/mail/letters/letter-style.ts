import type { CSSProperties } from "react";

/**
 * Mail programs keep inline styles and drop most else; those that keep the style sheet below follow the
 * reader's dark scheme by it. Colours are those of src/styles/tokens.css.
 */
const sans = "Archivo, 'Segoe UI', Roboto, Helvetica, Arial, sans-serif";

export const style = {
  body: { margin: 0, padding: 0, backgroundColor: "#f1f1eb", color: "#1b1f22" },
  sheet: { width: "100%", maxWidth: "36rem", margin: "0 auto", borderCollapse: "collapse" },
  head: { padding: "20px 24px", backgroundColor: "#1f2a32", color: "#ecebe2" },
  name: { margin: 0, font: `600 20px/1.2 ${sans}`, letterSpacing: "0.01em" },
  main: { padding: "28px 24px 12px", backgroundColor: "#fafaf6" },
  title: { margin: "0 0 18px", font: `700 24px/1.2 ${sans}` },
  paragraph: { margin: "0 0 18px", font: "18px/1.55 Georgia, 'Times New Roman', serif" },
  button: {
    display: "inline-block",
    margin: "6px 0 22px",
    padding: "13px 22px",
    borderRadius: "2px",
    backgroundColor: "#1c5787",
    color: "#ffffff",
    font: `600 17px/1.2 ${sans}`,
    textDecoration: "none",
  },
  small: { margin: "0 0 14px", font: `15px/1.5 ${sans}`, color: "#4e565b" },
  address: { color: "#1c5787", wordBreak: "break-all" },
  foot: {
    padding: "16px 24px 28px",
    borderTop: "1px solid #cdcec6",
    backgroundColor: "#fafaf6",
    font: `14px/1.5 ${sans}`,
    color: "#4e565b",
  },
} satisfies Record<string, CSSProperties>;

/** Chalk ticks under the name, as on a rule: drawn with borders, since mail programs show no SVG. */
export const tick = (tall: boolean): CSSProperties => ({
  display: "inline-block",
  width: "10px",
  height: tall ? "12px" : "7px",
  borderLeft: "1px solid #b3bec3",
  verticalAlign: "top",
});

export const darkScheme = `
:root { color-scheme: light dark; }
@media (prefers-color-scheme: dark) {
  .paper { background-color: #14181a !important; color: #e8e7e0 !important; }
  .sheet { background-color: #1c2224 !important; color: #e8e7e0 !important; border-color: #343c40 !important; }
  .soft { color: #aab2b5 !important; }
  .act { background-color: #86bae4 !important; color: #0d1b27 !important; }
  .address { color: #86bae4 !important; }
}`;
