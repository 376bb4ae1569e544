import type { Gesture, GestureTools, PointerAt } from "@/components/bench/canvas/gesture";
import { boxBetween } from "@/components/bench/canvas/band-gesture";
import { NO_OVERLAY } from "@/components/bench/canvas/overlay";
import { partFor } from "@/lib/drawing/add-row";
import { addParts, freeId, moveParts, wholeGroups } from "@/lib/drawing/edit-parts";
import { partAt } from "@/lib/drawing/pick";
import type { DrawingPart, PartShape } from "@/lib/drawing/schema";
import { snapPoint } from "@/lib/drawing/snap-point";
import { MIN_SIZE_MM } from "@/lib/geometry/limits";
import { orientRing } from "@/lib/geometry/ring";
import type { Point, Vertex } from "@/lib/geometry/region";

const place = (tools: GestureTools, shape: PartShape, at: Point, name?: string): void => {
  const part = { ...partFor(tools.act.drawing(), shape), at, ...(name ? { name } : {}) };
  tools.act.edit((d) => addParts(d, [part]));
  tools.act.pick([part.id]);
  tools.act.use("select");
};

const snapped = (tools: GestureTools, p: PointerAt, earlier: readonly Point[] = []) =>
  snapPoint(p.at, tools.act.drawing(), tools.snap(), earlier);

/** A plate pulled from corner to corner. */
export const plateGesture = (tools: GestureTools, start: PointerAt): Gesture => {
  const { show, formatLength } = tools;
  const from = snapped(tools, start).point;
  let to = from;
  return {
    move: (p) => {
      const hit = snapped(tools, p, [from]);
      to = hit.point;
      const band = boxBetween(from, to);
      show({
        band,
        flag: {
          at: to,
          head: hit.words || "free",
          note: `${formatLength(band.xMax - band.xMin)} by ${formatLength(band.yMax - band.yMin)}`,
        },
      });
    },
    up: () => {
      show(NO_OVERLAY);
      const band = boxBetween(from, to);
      const [width, height] = [band.xMax - band.xMin, band.yMax - band.yMin];
      if (width >= MIN_SIZE_MM && height >= MIN_SIZE_MM)
        place(tools, { kind: "plate", width, height }, { x: (from.x + to.x) / 2, y: (from.y + to.y) / 2 });
      else tools.act.say("A plate is pulled from corner to corner, or typed as 420x36 in the table.");
      return true;
    },
    cancel: () => show(NO_OVERLAY),
  };
};

/** A round, or a round hole, pulled from its centre. */
export const roundGesture = (tools: GestureTools, start: PointerAt, hole: boolean): Gesture => {
  const { show, formatLength } = tools;
  const centre = snapped(tools, start).point;
  let diameter = 0;
  return {
    move: (p) => {
      const hit = snapped(tools, p);
      diameter = 2 * Math.hypot(hit.point.x - centre.x, hit.point.y - centre.y);
      const ring: Vertex[] = [
        { x: centre.x + diameter / 2, y: centre.y, bulge: 1 },
        { x: centre.x - diameter / 2, y: centre.y, bulge: 1 },
      ];
      show({
        ghost: [ring],
        flag: { at: hit.point, head: hit.words || "free", note: `diameter ${formatLength(diameter)}` },
      });
    },
    up: () => {
      show(NO_OVERLAY);
      if (diameter < MIN_SIZE_MM) {
        tools.act.say("A round is pulled from its centre outwards.");
        return true;
      }
      const shape = { kind: "round", diameter } as const;
      if (!hole) place(tools, shape, centre);
      else {
        const part: DrawingPart = {
          id: freeId(tools.act.drawing()),
          name: "Hole",
          cutout: true,
          at: centre,
          angle: 0,
          shape,
        };
        tools.act.edit((d) => addParts(d, [part]));
        tools.act.pick([part.id]);
        tools.act.use("select");
      }
      return true;
    },
    cancel: () => show(NO_OVERLAY),
  };
};

const CLOSE_PX = 10;

/** An outline clicked vertex by vertex and closed on the first, or with Enter; Backspace takes the last one back. */
export const outlineGesture = (tools: GestureTools, start: PointerAt, pxPerMm: () => number): Gesture => {
  const { show, act, formatLength } = tools;
  const points: Point[] = [snapped(tools, start).point];
  const showDraft = (under: Point, words: string) => {
    const last = points.at(-1) ?? under;
    show({
      draft: [...points, under],
      flag: {
        at: under,
        head: words || "free",
        note: `${formatLength(under.x - last.x)}, ${formatLength(under.y - last.y)} · Enter closes`,
      },
    });
  };
  const close = (): boolean => {
    if (points.length < 3) {
      act.say("An outline needs three corners or more.");
      return false;
    }
    show(NO_OVERLAY);
    const origin = points[0] ?? { x: 0, y: 0 };
    const drawn = points.map((p) => ({ x: p.x - origin.x, y: p.y - origin.y }));
    const outer = orientRing(drawn, "outer").map(({ x, y }) => ({ x, y }));
    place(tools, { kind: "outline", outer, holes: [] }, origin, "Outline");
    return true;
  };
  return {
    move: (p) => {
      const hit = snapped(tools, p, points);
      showDraft(hit.point, hit.words);
    },
    up: () => false,
    press: (p) => {
      const hit = snapped(tools, p, points);
      const first = points[0] ?? hit.point;
      const near = Math.hypot(hit.point.x - first.x, hit.point.y - first.y) * pxPerMm() <= CLOSE_PX;
      if (near && points.length >= 3) return close();
      const last = points.at(-1) ?? first;
      if (Math.hypot(hit.point.x - last.x, hit.point.y - last.y) > 1e-6) points.push(hit.point);
      showDraft(hit.point, hit.words);
      return false;
    },
    key: (event) => {
      if (event.key === "Enter") return close() ? "done" : true;
      if (event.key === "Backspace") {
        if (points.length > 1) points.pop();
        showDraft(points.at(-1) ?? { x: 0, y: 0 }, "last corner taken back");
        return true;
      }
      return false;
    },
    cancel: () => show(NO_OVERLAY),
  };
};

/**
 * Two points clicked: the distance between them, along and across. After the second click a distance can be typed: the part
 * under the second point is moved so that it holds, along the longer of the two ways.
 */
export const dimensionGesture = (tools: GestureTools, start: PointerAt, reach: () => number): Gesture => {
  const { show, act, formatLength } = tools;
  const from = snapped(tools, start).point;
  let end: { to: Point; part: string | null } | null = null;
  let typed = "";
  const tell = (to: Point, words: string) => {
    const [dx, dy] = [to.x - from.x, to.y - from.y];
    const ask = typed ? `distance ${typed} · Enter sets it` : "type a distance to set it";
    show({
      measure: [from, to],
      flag: {
        at: to,
        head: `${formatLength(Math.hypot(dx, dy))} between the points`,
        note: `${formatLength(Math.abs(dx))} across, ${formatLength(Math.abs(dy))} up · ${end?.part ? ask : words || "free"}`,
      },
    });
  };
  const drive = (mm: number): void => {
    if (!end?.part) return;
    const [dx, dy] = [end.to.x - from.x, end.to.y - from.y];
    const by =
      Math.abs(dx) >= Math.abs(dy)
        ? { x: Math.sign(dx || 1) * mm - dx, y: 0 }
        : { x: 0, y: Math.sign(dy || 1) * mm - dy };
    const { part } = end;
    act.edit((d) => moveParts(d, wholeGroups(d, [part]), by));
    act.say(`The distance is ${formatLength(mm)}`);
  };
  return {
    move: (p) => {
      if (end) return;
      const hit = snapped(tools, p, [from]);
      tell(hit.point, hit.words);
    },
    up: () => false,
    press: (p) => {
      if (end) {
        show(NO_OVERLAY);
        return true;
      }
      const to = snapped(tools, p, [from]).point;
      end = { to, part: partAt(act.drawing(), to, reach()) };
      act.say(`${formatLength(Math.hypot(to.x - from.x, to.y - from.y))} between the points`);
      tell(to, "");
      return false;
    },
    key: (event) => {
      if (!end?.part) return false;
      if (event.key === "Enter" && typed) {
        const mm = tools.readLength(typed);
        if (mm === null || mm < 0) return true;
        drive(mm);
        show(NO_OVERLAY);
        return "done";
      }
      if (event.key === "Backspace") typed = typed.slice(0, -1);
      else if (event.key.length === 1 && !event.ctrlKey && !event.metaKey) typed += event.key;
      else return false;
      tell(end.to, "");
      return true;
    },
    cancel: () => show(NO_OVERLAY),
  };
};
