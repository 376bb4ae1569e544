import next from "eslint-config-next/core-web-vitals";
import typescript from "eslint-config-next/typescript";

const config = [
  { ignores: ["node_modules/**", ".next/**", "data/**", "coverage/**", "migrations/**", "next-env.d.ts"] },
  ...next,
  ...typescript,
  {
    rules: {
      "@typescript-eslint/no-explicit-any": "error",
      "@typescript-eslint/no-unused-vars": ["error", { argsIgnorePattern: "^_", ignoreRestSiblings: true }],
      "@typescript-eslint/consistent-type-imports": "error",
      "@typescript-eslint/ban-ts-comment": "error",
      "no-empty": ["error", { allowEmptyCatch: false }],
      eqeqeq: ["error", "always"],
      "no-restricted-properties": [
        "error",
        {
          property: "toBeCloseTo",
          message: "Use expectRel from tests/helpers/expect-rel: named, relative tolerances.",
        },
      ],
    },
  },
  {
    files: ["app/**", "components/**"],
    rules: { "no-restricted-globals": ["error", "alert", "confirm", "prompt"] },
  },
];

export default config;
