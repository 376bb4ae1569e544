import fc from "fast-check";

/** On a shared build server random tests repeat one seed, so that a change is judged by itself; elsewhere each run draws anew. */
const REPEATED_SEED = 20_261_201;

const { CI, FC_SEED } = process.env;
if (FC_SEED !== undefined) fc.configureGlobal({ seed: Number(FC_SEED) });
else if (CI) fc.configureGlobal({ seed: REPEATED_SEED });
