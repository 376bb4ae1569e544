// Zod looks whether it may compile its parsers (new Function), which the content security policy reports as a violation.
// Set before the first schema exists; zod keeps its settings under this name (zod/v4/core/core).
Object.assign(globalThis, { __zod_globalConfig: { jitless: true } });

export {};
