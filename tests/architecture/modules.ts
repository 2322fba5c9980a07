// The repository's sources as modules with their imports: read from disk, or made up by a test.

import { readdirSync, readFileSync } from "node:fs";
import { posix } from "node:path";
import ts from "typescript";

/** Text by path from the repository's root, with forward slashes. Holds the package.json files too. */
export type Sources = ReadonlyMap<string, string>;

export interface Import {
  readonly specifier: string;
  readonly line: number;
  /** The file it leads to, where that file is among the sources. */
  readonly target: string | null;
}

export interface Module {
  readonly path: string;
  /** The workspace's folder, such as `app` or `packages/kinematics`. */
  readonly workspace: string;
  readonly imports: readonly Import[];
  readonly defaultExportLine: number | null;
  /** Every name used as a value, with its line: `fetch`, `Date`, `Math.random`. */
  readonly uses: readonly { readonly name: string; readonly line: number }[];
  readonly lineCount: number;
  readonly text: string;
}

export const WORKSPACES = [
  "app",
  "server",
  "db",
  "tests",
  "e2e",
  "packages/kinematics",
  "packages/contract",
  "packages/cli",
] as const;

const SKIPPED_FOLDERS = new Set(["node_modules", "dist", ".expo", ".git", ".pg", ".data", "migrations"]);
const SOURCE = /\.(ts|tsx|mts|cts|js|mjs|cjs)$/;

export function readSources(root: string): Sources {
  const sources = new Map<string, string>();
  const walk = (folder: string): void => {
    for (const entry of readdirSync(`${root}/${folder}`, { withFileTypes: true })) {
      const path = posix.join(folder, entry.name);
      if (entry.isDirectory()) {
        if (!SKIPPED_FOLDERS.has(entry.name)) walk(path);
      } else if (
        (SOURCE.test(entry.name) && !entry.name.endsWith(".d.ts")) ||
        entry.name === "package.json"
      ) {
        sources.set(path, readFileSync(`${root}/${path}`, "utf8"));
      }
    }
  };
  for (const workspace of WORKSPACES) walk(workspace);
  sources.set("package.json", readFileSync(`${root}/package.json`, "utf8"));
  return sources;
}

export function workspaceOf(path: string): string {
  const [first, second] = path.split("/");
  return first === "packages" ? `${first}/${second}` : first!;
}

export interface Manifest {
  readonly name: string;
  readonly exports: Readonly<Record<string, string>>;
  readonly declared: ReadonlySet<string>;
}

export function manifestOf(sources: Sources, workspace: string): Manifest | null {
  const text = sources.get(posix.join(workspace, "package.json"));
  if (text === undefined) return null;
  const json = JSON.parse(text) as {
    name: string;
    exports?: string | Record<string, string>;
    dependencies?: Record<string, string>;
    devDependencies?: Record<string, string>;
  };
  return {
    name: json.name,
    exports: typeof json.exports === "string" ? { ".": json.exports } : (json.exports ?? {}),
    declared: new Set(Object.keys({ ...json.dependencies, ...json.devDependencies })),
  };
}

/** `@scope/name/sub` → `@scope/name` and `./sub`. */
export function splitSpecifier(specifier: string): { name: string; subpath: string } {
  const parts = specifier.split("/");
  const size = specifier.startsWith("@") ? 2 : 1;
  const rest = parts.slice(size).join("/");
  return { name: parts.slice(0, size).join("/"), subpath: rest === "" ? "." : `./${rest}` };
}

function findSource(sources: Sources, path: string): string | null {
  const candidates = [path, `${path}.ts`, `${path}.tsx`, `${path}/index.ts`, `${path}/index.tsx`];
  return candidates.find((candidate) => sources.has(candidate)) ?? null;
}

function resolveTarget(sources: Sources, from: string, specifier: string): string | null {
  if (specifier.startsWith(".")) return findSource(sources, posix.join(posix.dirname(from), specifier));
  if (specifier.startsWith("@/")) return findSource(sources, posix.join("app/src", specifier.slice(2)));
  const { name, subpath } = splitSpecifier(specifier);
  for (const workspace of WORKSPACES) {
    const manifest = manifestOf(sources, workspace);
    if (manifest?.name === name) {
      const entry = manifest.exports[subpath];
      return entry === undefined ? null : findSource(sources, posix.join(workspace, entry));
    }
  }
  return null;
}

/** Static imports and re-exports, `import()` and `require()` of a literal, `import("…")` types. */
function specifierOf(node: ts.Node): ts.StringLiteralLike | null {
  if ((ts.isImportDeclaration(node) || ts.isExportDeclaration(node)) && node.moduleSpecifier) {
    return ts.isStringLiteralLike(node.moduleSpecifier) ? node.moduleSpecifier : null;
  }
  if (ts.isImportTypeNode(node) && ts.isLiteralTypeNode(node.argument)) {
    return ts.isStringLiteralLike(node.argument.literal) ? node.argument.literal : null;
  }
  if (ts.isCallExpression(node)) {
    const callee = node.expression;
    const loads =
      callee.kind === ts.SyntaxKind.ImportKeyword || (ts.isIdentifier(callee) && callee.text === "require");
    const [argument] = node.arguments;
    return loads && argument && ts.isStringLiteralLike(argument) ? argument : null;
  }
  return null;
}

function isDefaultExport(node: ts.Node): boolean {
  if (ts.isExportAssignment(node)) return true;
  if (ts.isExportSpecifier(node)) return node.name.text === "default";
  return (
    ts.canHaveModifiers(node) &&
    (ts.getModifiers(node) ?? []).some(({ kind }) => kind === ts.SyntaxKind.DefaultKeyword)
  );
}

/** A global read as a value: a bare identifier that is no property name and no declaration, or `Object.member`. */
function usedName(node: ts.Node): string | null {
  if (ts.isPropertyAccessExpression(node) && ts.isIdentifier(node.expression)) {
    return `${node.expression.text}.${node.name.text}`;
  }
  if (!ts.isIdentifier(node)) return null;
  const { parent } = node;
  if (ts.isPropertyAccessExpression(parent)) return parent.expression === node ? node.text : null;
  const reads = (ts.isCallExpression(parent) || ts.isNewExpression(parent)) && parent.expression === node;
  return reads ? node.text : null;
}

function parseModule(sources: Sources, path: string, text: string): Module {
  const file = ts.createSourceFile(path, text, ts.ScriptTarget.Latest, true);
  const lineOf = (node: ts.Node): number => file.getLineAndCharacterOfPosition(node.getStart(file)).line + 1;
  const imports: Import[] = [];
  const uses: { name: string; line: number }[] = [];
  let defaultExportLine: number | null = null;
  const visit = (node: ts.Node): void => {
    const specifier = specifierOf(node);
    if (specifier !== null) {
      const target = resolveTarget(sources, path, specifier.text);
      imports.push({ specifier: specifier.text, line: lineOf(node), target });
    }
    if (isDefaultExport(node)) defaultExportLine ??= lineOf(node);
    const name = usedName(node);
    if (name !== null) uses.push({ name, line: lineOf(node) });
    ts.forEachChild(node, visit);
  };
  visit(file);
  const lineCount = text.split("\n").length - (text.endsWith("\n") ? 1 : 0);
  return { path, workspace: workspaceOf(path), imports, defaultExportLine, uses, lineCount, text };
}

export function parseModules(sources: Sources): Module[] {
  return [...sources]
    .filter(([path]) => SOURCE.test(path))
    .map(([path, text]) => parseModule(sources, path, text));
}
