import type { DisplayList } from "@/lib/figure/display-list";
import { paintedStrokes } from "@/lib/figure/paint";
import type { Ink, Stroke } from "@/lib/figure/stroke";

/** Ink on white: what leaves the house is to survive a photocopier. */
const PRINT: Readonly<Record<Ink, string>> = {
  ink: "#000000",
  cut: "#000000",
  hatch: "#333333",
  "hatch-hand": "#333333",
  oxide: "#000000",
  "oxide-ink": "#000000",
  "oxide-wash": "#ffffff",
  "on-oxide": "#ffffff",
  sheet: "#ffffff",
  axis: "#000000",
  mill: "#333333",
  "mill-ink": "#000000",
  dim: "#222222",
  ghost: "#777777",
  grid: "#ffffff",
  chalk: "#ffffff",
  "chalk-ink": "#000000",
};

const FONT = {
  figure: `font-family="monospace" font-size="12"`,
  axis: `font-family="sans-serif" font-size="14" font-style="italic"`,
  ruler: `font-family="monospace" font-size="11"`,
  balloon: `font-family="monospace" font-size="11.5" font-weight="600"`,
} as const;

const escapeText = (text: string): string =>
  text
    .replace(/[\u0000-\u0008\u000b\u000c\u000e-\u001f]/g, "")
    .replaceAll("&", "&amp;")
    .replaceAll("<", "&lt;")
    .replaceAll(">", "&gt;")
    .replaceAll('"', "&quot;");

const ink = (role: Ink | null) => (role === null ? "none" : PRINT[role]);

const strokeMarkup = (s: Stroke): string => {
  if (s.kind === "path") {
    const line = s.line === null ? "" : ` stroke="${ink(s.line)}" stroke-width="${s.widthPx}"`;
    const dash = s.dashPx ? ` stroke-dasharray="${s.dashPx.join(" ")}"` : "";
    return `<path d="${s.data}" fill="${ink(s.fill)}" fill-rule="evenodd"${line}${dash}/>`;
  }
  const place =
    s.turnDeg === 0 ? `x="${s.x}" y="${s.y}"` : `transform="translate(${s.x} ${s.y}) rotate(${s.turnDeg})"`;
  const halo =
    s.face === "balloon" || s.face === "ruler"
      ? ""
      : ` paint-order="stroke" stroke="#ffffff" stroke-width="3.5" stroke-linejoin="round"`;
  return `<text ${place} text-anchor="${s.anchor}" fill="${ink(s.ink)}" ${FONT[s.face]}${halo}>${escapeText(s.text)}</text>`;
};

export type SvgInput = Readonly<{
  list: DisplayList;
  widthPx: number;
  heightPx: number;
  /** What the figure shows: designation and revision. */
  title: string;
  /** Lines under the figure: revision, date, what was not checked. */
  captions?: readonly string[];
}>;

/** A figure as an SVG document of its own, ink on white, with its title and captions. */
export const figureSvg = ({ list, widthPx, heightPx, title, captions = [] }: SvgInput): string => {
  const total = heightPx + captions.length * 16 + (captions.length > 0 ? 8 : 0);
  const notes = captions
    .map(
      (line, i) =>
        `<text x="12" y="${heightPx + 14 + i * 16}" fill="#222222" font-family="sans-serif" font-size="11">${escapeText(line)}</text>`,
    )
    .join("");
  return [
    `<svg xmlns="http://www.w3.org/2000/svg" width="${widthPx}" height="${total}" viewBox="0 0 ${widthPx} ${total}" role="img">`,
    `<title>${escapeText(title)}</title>`,
    `<rect width="100%" height="100%" fill="#ffffff"/>`,
    ...paintedStrokes(list, widthPx, heightPx).map(strokeMarkup),
    notes,
    `</svg>`,
  ].join("");
};
