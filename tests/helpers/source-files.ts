import { existsSync, readdirSync, readFileSync, statSync } from "node:fs";
import { dirname, join, normalize, relative } from "node:path";
import { fileURLToPath } from "node:url";
import ts from "typescript";

export const ROOT = fileURLToPath(new URL("../..", import.meta.url));

/** Source files of a folder, or of `folder.ts` where it is a single file; paths relative to the root. */
export const filesIn = (folder: string): string[] => {
  const base = join(ROOT, folder);
  for (const ending of [".ts", ".tsx"]) if (existsSync(base + ending)) return [folder + ending];
  if (!existsSync(base) || !statSync(base).isDirectory()) return [];
  return readdirSync(base, { recursive: true, encoding: "utf8" })
    .filter((name) => /\.(ts|tsx|mts|mjs)$/.test(name))
    .map((name) => join(folder, name))
    .sort();
};

const specifiersIn = (file: string): string[] => {
  const source = ts.createSourceFile(
    file,
    readFileSync(join(ROOT, file), "utf8"),
    ts.ScriptTarget.Latest,
    true,
  );
  const found: string[] = [];
  const visit = (node: ts.Node): void => {
    if ((ts.isImportDeclaration(node) || ts.isExportDeclaration(node)) && node.moduleSpecifier) {
      if (ts.isStringLiteral(node.moduleSpecifier)) found.push(node.moduleSpecifier.text);
    }
    if (ts.isCallExpression(node) && node.expression.kind === ts.SyntaxKind.ImportKeyword) {
      const target = node.arguments[0];
      if (target && ts.isStringLiteral(target)) found.push(target.text);
    }
    if (ts.isImportTypeNode(node) && ts.isLiteralTypeNode(node.argument)) {
      if (ts.isStringLiteral(node.argument.literal)) found.push(node.argument.literal.text);
    }
    if (ts.isNewExpression(node) && node.expression.getText(source) === "URL") {
      const target = node.arguments?.[0];
      if (target && ts.isStringLiteral(target) && /^[.@]/.test(target.text)) found.push(target.text);
    }
    ts.forEachChild(node, visit);
  };
  visit(source);
  return found;
};

/** What a file imports: our own modules as paths from the root without ending, or with `external` the packages. */
export const importsOf = (file: string, { external = false } = {}): string[] =>
  specifiersIn(file)
    .filter((s) => (s.startsWith("@/") || s.startsWith(".")) !== external)
    .map((s) => {
      if (external) return s;
      const path = s.startsWith("@/") ? s.slice(2) : relative(ROOT, normalize(join(ROOT, dirname(file), s)));
      return path.replace(/\.(tsx?|mts|mjs|css)$/, "");
    });
