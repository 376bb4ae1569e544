import { expect, test } from "vitest";
import { figureSvg } from "@/lib/export/svg";
import { composeFigure, SHOW_ALL } from "@/lib/figure/compose-figure";
import { girderParts, girderTouching } from "@/tests/helpers/figure-girder";

const list = composeFigure({
  parts: girderParts,
  touching: girderTouching,
  properties: null,
  welds: [],
  pxPerMm: 0.5,
  formatLength: String,
  show: SHOW_ALL,
});

test("the figure as a document of its own carries title and captions, escaped, and no number that is not finite", () => {
  const svg = figureSvg({
    list,
    widthPx: 600,
    heightPx: 480,
    title: `PG <632> & "lip"`,
    captions: ["Revision A, draft", "Local buckling not checked"],
  });
  expect(svg).toContain("<title>PG &lt;632&gt; &amp; &quot;lip&quot;</title>");
  expect(svg).toContain("Revision A, draft");
  expect(svg).not.toMatch(/NaN|Infinity|undefined|var\(/);
});
