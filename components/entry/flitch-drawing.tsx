/** Sizes of the beam drawn on the sign-in sheet, mm: two timbers with a steel flitch plate, through-bolted. */
const BEAM = { timber: 75, depth: 300, plate: 12, plateDepth: 280, gap: 10, bolt: 16, edge: 60 } as const;
const BOLT_PITCH = [75, 180, 180, 180] as const;

const SCALE = 1.18;
const px = (mm: number) => Math.round(mm * SCALE * 10) / 10;
const TOP = 116;
const FOOT = TOP + px(BEAM.depth);
const LEFT = 154;
const WEB_LEFT = LEFT + px(BEAM.timber);
const WEB_RIGHT = WEB_LEFT + px(BEAM.plate);
const RIGHT = WEB_RIGHT + px(BEAM.timber);
const MIDDLE = (WEB_LEFT + WEB_RIGHT) / 2;
const PLATE_TOP = TOP + px(BEAM.gap);
const PLATE_FOOT = FOOT - px(BEAM.gap);
const ROWS = [TOP + px(BEAM.edge + BEAM.bolt), FOOT - px(BEAM.edge + BEAM.bolt)] as const;
const ELEVATION = 535;

const RINGS = Array.from({ length: 24 }, (_, i) => 22 + i * 18.5);
const chain = { stroke: "var(--fb-axis)", strokeDasharray: "14 3 2 3", fill: "none" } as const;

const tick = (x: number, y: number) => `M${x - 4} ${y + 4}l8 -8`;

type AcrossProps = Readonly<{
  from: number;
  to: number;
  y: number;
  edge: number;
  text: string;
  /** The figure stands beside the line where the gap is too narrow for it. */
  beside?: boolean;
}>;

/** A dimension across: extension lines, 45° ticks, figure above the line. */
function Across({ from, to, y, edge, text, beside }: AcrossProps) {
  const side = Math.sign(y - edge);
  const reach = `V${y + 5 * side}`;
  return (
    <>
      <path
        d={`M${from} ${edge + 4 * side}${reach}M${to} ${edge + 4 * side}${reach}M${from} ${y}H${beside ? to + 40 : to}`}
        stroke="var(--fb-dim)"
        fill="none"
      />
      <path d={tick(from, y) + tick(to, y)} stroke="var(--fb-dim)" strokeWidth="1.6" />
      <text
        x={beside ? to + 14 : (from + to) / 2}
        y={y - 4}
        textAnchor={beside ? "start" : "middle"}
        className="fill-dim font-num text-[12px]"
      >
        {text}
      </text>
    </>
  );
}

const Bolt = ({ y }: { y: number }) => (
  <>
    <g fill="var(--fb-sheet)" stroke="var(--fb-cut)" strokeWidth="1.3">
      <path d={`M${LEFT - 4} ${y - 9}H${RIGHT + 4}V${y + 9}H${LEFT - 4}Z`} />
      <path d={`M${LEFT - 4} ${y - 25}h-4v50h4zM${RIGHT + 4} ${y - 25}h4v50h-4z`} />
      <path d={`M${LEFT - 8} ${y - 15}h-11v30h11zM${RIGHT + 8} ${y - 15}h13v30h-13z`} />
    </g>
    <path d={`M${LEFT - 44} ${y}H${RIGHT + 44}`} {...chain} />
  </>
);

const BoltHead = ({ x, y }: { x: number; y: number }) => {
  const hexagon = Array.from({ length: 6 }, (_, i) => {
    const a = (i * Math.PI) / 3;
    return `${(x + 15 * Math.cos(a)).toFixed(1)} ${(y + 15 * Math.sin(a)).toFixed(1)}`;
  }).join("L");
  return (
    <>
      <circle cx={x} cy={y} r="25" fill="var(--fb-sheet)" stroke="var(--fb-cut)" strokeWidth="1.2" />
      <path d={`M${hexagon}Z`} fill="none" stroke="var(--fb-cut)" strokeWidth="1.4" />
      <path d={`M${x - 31} ${y}h62M${x} ${y - 31}v62`} {...chain} strokeDasharray="12 3 2 3" />
    </>
  );
};

const GRAIN = [179, 204, 262, 293, 331, 387, 428].map(
  (y, i) =>
    `M${ELEVATION + 26 + i * 9} ${y}c120 ${3 - (i % 3) * 3} 220 ${(i % 3) * 3 - 3} 330 1.5s180 3 320 0`,
);

const boltXs = BOLT_PITCH.map(
  (_, i) => ELEVATION + px(BOLT_PITCH.slice(0, i + 1).reduce((a, b) => a + b, 0)),
);

/** The flitch beam that gave the book its name, drawn to scale: section and elevation. Decoration for the eye only. */
export const FlitchDrawing = ({ className }: { className?: string }) => (
  <svg viewBox="0 0 1380 600" aria-hidden className={className}>
    <clipPath id="timbers">
      <path
        d={`M${LEFT} ${TOP}H${WEB_LEFT}V${FOOT}H${LEFT}ZM${WEB_RIGHT} ${TOP}H${RIGHT}V${FOOT}H${WEB_RIGHT}Z`}
      />
    </clipPath>
    <g clipPath="url(#timbers)" fill="none" stroke="var(--fb-hatch)">
      {RINGS.map((r) => (
        <circle key={r} cx={MIDDLE} cy={FOOT + 36} r={r} />
      ))}
    </g>
    <path
      d={`M${LEFT} ${TOP}H${WEB_LEFT}V${FOOT}H${LEFT}ZM${WEB_RIGHT} ${TOP}H${RIGHT}V${FOOT}H${WEB_RIGHT}Z`}
      fill="none"
      stroke="var(--fb-cut)"
      strokeWidth="2"
    />
    <path d={`M${WEB_LEFT} ${PLATE_TOP}H${WEB_RIGHT}V${PLATE_FOOT}H${WEB_LEFT}Z`} fill="var(--fb-oxide)" />
    {ROWS.map((y) => (
      <Bolt key={y} y={y} />
    ))}
    <path d={`M${MIDDLE} ${TOP - 36}V${FOOT + 32}`} {...chain} />
    <Across from={LEFT} to={WEB_LEFT} y={76} edge={TOP} text="75" />
    <Across from={WEB_RIGHT} to={RIGHT} y={76} edge={TOP} text="75" />
    <Across from={WEB_LEFT} to={WEB_RIGHT} y={46} edge={TOP} text="12" beside />
    <Across from={LEFT} to={RIGHT} y={530} edge={FOOT} text="162" />
    <path
      d={`M${LEFT - 26} ${FOOT}H83M${LEFT - 26} ${TOP}H83M88 ${FOOT}V${TOP}`}
      stroke="var(--fb-dim)"
      fill="none"
    />
    <path d={tick(88, TOP) + tick(88, FOOT)} stroke="var(--fb-dim)" strokeWidth="1.6" />
    <text
      transform={`translate(84 ${(TOP + FOOT) / 2}) rotate(-90)`}
      textAnchor="middle"
      className="fill-dim font-num text-[12px]"
    >
      300
    </text>

    <path d={`M1296 ${TOP}H${ELEVATION}V${FOOT}H1296`} fill="none" stroke="var(--fb-cut)" strokeWidth="2" />
    <path d={`M1296 ${TOP - 12}V266l-13 10 26 22-13 10V${FOOT + 12}`} fill="none" stroke="var(--fb-cut)" />
    <path
      d={`M${ELEVATION} ${PLATE_TOP}H1290M${ELEVATION} ${PLATE_FOOT}H1290`}
      stroke="var(--fb-oxide-ink)"
      strokeWidth="1.2"
      strokeDasharray="5 3"
    />
    <path d={GRAIN.join("")} fill="none" stroke="var(--fb-rule)" />
    {boltXs.map((x, i) => (
      <BoltHead key={x} x={x} y={i % 2 === 0 ? ROWS[0] : ROWS[1]} />
    ))}
    <BoltHead x={boltXs[0] ?? 0} y={ROWS[1]} />
    {boltXs.map((x, i) => (
      <Across
        key={x}
        from={i === 0 ? ELEVATION : (boltXs[i - 1] ?? 0)}
        to={x}
        y={520}
        edge={FOOT}
        text={String(BOLT_PITCH[i])}
      />
    ))}
    <path d={`M930 ${PLATE_TOP}l30 -46h15`} stroke="var(--fb-dim)" fill="none" />
    <circle cx="930" cy={PLATE_TOP} r="2.2" fill="var(--fb-ink)" />
    <text x="981" y={PLATE_TOP - 42} className="fill-ink-2 text-[14px]">
      flitch plate 12×280, red oxide both faces
    </text>
    <text x={ELEVATION} y="86" className="fill-ink text-[14px] font-[640]">
      Elevation
    </text>
    <text x={MIDDLE} y="566" textAnchor="middle" className="fill-ink text-[14px] font-[640]">
      Section
    </text>
  </svg>
);
