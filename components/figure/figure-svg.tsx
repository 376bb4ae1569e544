import type { DisplayList } from "@/lib/figure/display-list";
import { paintedStrokes } from "@/lib/figure/paint";
import type { Ink, Stroke } from "@/lib/figure/stroke";

const ink = (role: Ink | null) => (role === null ? "none" : `var(--fb-${role})`);

const FACES = {
  figure: { fontFamily: "var(--fb-font-num)", fontSize: 12, fontWeight: 460, fontStyle: "normal" },
  axis: { fontFamily: "var(--fb-font-ui)", fontSize: 14, fontWeight: 560, fontStyle: "italic" },
  ruler: { fontFamily: "var(--fb-font-num)", fontSize: 11, fontWeight: 440, fontStyle: "normal" },
  balloon: { fontFamily: "var(--fb-font-num)", fontSize: 11.5, fontWeight: 560, fontStyle: "normal" },
} as const;

const StrokeElement = ({ stroke }: { stroke: Stroke }) => {
  if (stroke.kind === "path")
    return (
      <path
        d={stroke.data}
        fill={ink(stroke.fill)}
        fillRule="evenodd"
        stroke={ink(stroke.line)}
        strokeWidth={stroke.widthPx}
        strokeDasharray={stroke.dashPx?.join(" ")}
      />
    );
  const halo =
    stroke.face === "balloon" || stroke.face === "ruler"
      ? {}
      : {
          paintOrder: "stroke",
          stroke: "var(--fb-sheet)",
          strokeWidth: 3.5,
          strokeLinejoin: "round" as const,
        };
  return (
    <text
      x={stroke.turnDeg === 0 ? stroke.x : undefined}
      y={stroke.turnDeg === 0 ? stroke.y : undefined}
      transform={
        stroke.turnDeg === 0 ? undefined : `translate(${stroke.x} ${stroke.y}) rotate(${stroke.turnDeg})`
      }
      textAnchor={stroke.anchor}
      fill={ink(stroke.ink)}
      {...FACES[stroke.face]}
      {...halo}
    >
      {stroke.text}
    </text>
  );
};

/** A figure as SVG in the colours of the theme; usable in server components. `label` says what it shows. */
export const FigureSvg = ({
  list,
  width,
  height,
  label,
  className,
}: {
  list: DisplayList;
  width: number;
  height: number;
  label: string;
  className?: string;
}) => (
  <svg
    viewBox={`0 0 ${width} ${height}`}
    width={width}
    height={height}
    role="img"
    aria-label={label}
    className={className}
  >
    {paintedStrokes(list, width, height).map((stroke, i) => (
      <StrokeElement key={i} stroke={stroke} />
    ))}
  </svg>
);
