import type { SectionProperties } from "@/lib/section/properties";

/** Two runs of the same engine on the same drawing agree to rounding; more than this is a fault of ours. */
const AGREE_REL = 1e-9;

const KEYS = [
  "area",
  "mass",
  "Ix",
  "Iy",
  "I1",
  "I2",
  "SxTop",
  "SxBottom",
  "SyLeft",
  "SyRight",
  "Zx",
  "Zy",
  "rx",
  "ry",
] as const;

/** Sentences about figures in which browser and server differ; the server's are the ones that are stored. */
export const figureFaults = (browser: SectionProperties, server: SectionProperties): string[] =>
  KEYS.flatMap((key) => {
    const [own, theirs] = [browser[key], server[key]];
    if (own === null || theirs === null)
      return own === theirs ? [] : [`${key} was computed on one side only.`];
    const off = Math.abs(own - theirs) / Math.max(Math.abs(theirs), Number.MIN_VALUE);
    return off <= AGREE_REL
      ? []
      : [
          `${key}: this browser computed ${own}, the server ${theirs}. The server's figure is stored. Report this: it is a fault of the program.`,
        ];
  });
