// What may import what, and what may be written where. Each rule lists the places that break it.

import { type Module, manifestOf, type Sources, splitSpecifier, workspaceOf } from "./modules.ts";

export interface Breach {
  readonly where: string;
  readonly what: string;
}

export type Rule = (modules: readonly Module[], sources: Sources) => Breach[];

/** Tests may look at anything; they are held to fewer rules than what is shipped. */
export function isTestFile(path: string): boolean {
  return /\.(test|spec)\.tsx?$/.test(path) || path.startsWith("tests/") || path.startsWith("e2e/");
}

const isToolConfig = (path: string): boolean =>
  /\.config\.[cm]?[jt]s$/.test(path) || /(^|\/)global(Setup|Teardown)\.ts$/.test(path);

function breach(module: Module, line: number, what: string): Breach {
  return { where: `${module.path}:${line}`, what };
}

const ARROWS: Readonly<Record<string, readonly string[]>> = {
  "packages/kinematics": [],
  "packages/contract": ["packages/kinematics"],
  "packages/cli": ["packages/contract", "packages/kinematics"],
  db: ["packages/contract"],
  server: ["packages/contract", "packages/kinematics", "db"],
  app: ["packages/contract", "packages/kinematics"],
  e2e: ["packages/contract"],
};

/** Where an import leads: the workspace, whether named as a package or walked into by path. */
function workspaceReached(sources: Sources, module: Module, specifier: string, target: string | null) {
  if (target !== null) return workspaceOf(target);
  const { name } = splitSpecifier(specifier);
  return (
    [...Object.keys(ARROWS), "tests"].find((workspace) => manifestOf(sources, workspace)?.name === name) ??
    module.workspace
  );
}

export const workspaceArrows: Rule = (modules, sources) =>
  modules.flatMap((module) => {
    const allowed = ARROWS[module.workspace];
    if (allowed === undefined || (isTestFile(module.path) && module.workspace !== "e2e")) return [];
    return module.imports.flatMap(({ specifier, target, line }) => {
      const reached = workspaceReached(sources, module, specifier, target);
      if (reached === module.workspace || allowed.includes(reached)) return [];
      return [breach(module, line, `${module.workspace} must not import ${reached} ("${specifier}")`)];
    });
  });

/** Another package is entered by its name and through a door its package.json opens, never by path. */
export const packageDoors: Rule = (modules, sources) =>
  modules.flatMap((module) =>
    module.imports.flatMap(({ specifier, target, line }) => {
      const reached = workspaceReached(sources, module, specifier, target);
      if (reached === module.workspace) return [];
      const byPath = specifier.startsWith(".");
      const testHelper = isTestFile(module.path) && target?.startsWith("tests/helpers/");
      if (byPath) {
        return testHelper ? [] : [breach(module, line, `reaches into ${reached} by path ("${specifier}")`)];
      }
      const { subpath } = splitSpecifier(specifier);
      const open = manifestOf(sources, reached)?.exports[subpath] !== undefined;
      return open ? [] : [breach(module, line, `"${specifier}" is no door of ${reached}`)];
    }),
  );

/**
 * What a fresh install puts in reach of a workspace is what its own package.json (or the root's) asks for; a test
 * beside the code may also use what the tests ask for.
 */
export const declaredDependencies: Rule = (modules, sources) =>
  modules.flatMap((module) =>
    module.imports.flatMap(({ specifier, line }) => {
      if (/^(\.|@\/|node:)/.test(specifier)) return [];
      const { name } = splitSpecifier(specifier);
      const askers = [module.workspace, ".", ...(isTestFile(module.path) ? ["tests"] : [])];
      const declared = askers.some((workspace) => manifestOf(sources, workspace)?.declared.has(name));
      const itself = manifestOf(sources, module.workspace)?.name === name;
      return declared || itself
        ? []
        : [breach(module, line, `${module.workspace}/package.json does not ask for "${name}"`)];
    }),
  );

const KINEMATICS = "packages/kinematics/src/";
const FOLDER_ARROWS: Readonly<Record<string, readonly string[]>> = {
  geometry: [],
  model: ["geometry"],
  solver: ["geometry"],
  pose: ["geometry", "model", "solver"],
  metrics: ["geometry", "model", "solver", "pose"],
  sweeps: ["geometry", "model", "solver", "pose", "metrics"],
  studies: ["geometry", "model", "solver", "pose", "metrics", "sweeps"],
};

/** `solver` of packages/kinematics/src/solver/newton.ts; null for the files beside the folders (units.ts, index.ts). */
function kinematicsFolder(path: string): string | null {
  const parts = path.slice(KINEMATICS.length).split("/");
  return path.startsWith(KINEMATICS) && parts.length > 1 ? parts[0]! : null;
}

export const kinematicsFolders: Rule = (modules) =>
  modules
    .filter(({ path }) => path.startsWith(KINEMATICS) && !isTestFile(path))
    .flatMap((module) => {
      const folder = kinematicsFolder(module.path);
      const isDoor = module.path === `${KINEMATICS}index.ts`;
      if (folder !== null && FOLDER_ARROWS[folder] === undefined) {
        return [breach(module, 1, `the folder ${folder} has no place in the picture of arrows`)];
      }
      return module.imports.flatMap(({ target, line }) => {
        if (target === null || isDoor) return [];
        const reached = kinematicsFolder(target);
        if (target === `${KINEMATICS}index.ts`)
          return [breach(module, line, "imports its own door, index.ts")];
        if (reached === null || reached === folder) return [];
        if (folder !== null && FOLDER_ARROWS[folder]!.includes(reached)) return [];
        return [breach(module, line, `${folder ?? "a root file"} must not import ${reached}`)];
      });
    });

const IMPURE =
  /^(Math\.random|Date|Date\.now|console\.\w+|process\.\w+|performance\.now|fetch|setTimeout|setInterval|localStorage\.\w+|window\.\w+|document\.\w+|crypto\.\w+)$/;

export const kinematicsIsPure: Rule = (modules) =>
  modules
    .filter(({ path }) => path.startsWith(KINEMATICS) && !isTestFile(path))
    .flatMap((module) => [
      ...module.imports
        .filter(({ specifier }) => !specifier.startsWith("."))
        .filter(
          ({ specifier }) => specifier !== "ml-matrix" || module.path !== `${KINEMATICS}solver/linalg.ts`,
        )
        .map(({ specifier, line }) =>
          breach(
            module,
            line,
            specifier === "ml-matrix"
              ? "only solver/linalg.ts imports ml-matrix"
              : `kinematics must not import "${specifier}"`,
          ),
        ),
      ...module.uses
        .filter(({ name }) => IMPURE.test(name))
        .map(({ name, line }) => breach(module, line, `kinematics must not use ${name}`)),
    ]);

/** Degrees and radians change into one another in units.ts alone. */
export const oneDegreeFactor: Rule = (modules) =>
  modules
    .filter(
      ({ path }) => path.startsWith(KINEMATICS) && !isTestFile(path) && path !== `${KINEMATICS}units.ts`,
    )
    .flatMap((module) =>
      module.text
        .split("\n")
        .flatMap((line, index) =>
          /180(\.0)?\s*\/\s*Math\.PI|Math\.PI\s*\/\s*180/.test(line)
            ? [breach(module, index + 1, "converts degrees itself instead of through units.ts")]
            : [],
        ),
    );

export const oneFetch: Rule = (modules) =>
  modules
    .filter(
      ({ path }) => path.startsWith("app/src/") && !isTestFile(path) && path !== "app/src/api/client.ts",
    )
    .flatMap((module) =>
      module.uses
        .filter(({ name }) => /^((window|globalThis|self)\.)?fetch$|^XMLHttpRequest$/.test(name))
        .map(({ name, line }) => breach(module, line, `calls ${name}; only app/src/api/client.ts does`)),
    );

const FEATURE = /^(app\/src\/features\/[^/]+)\//;

/** A feature's index.ts is its only door, for its siblings and for everyone else. */
export const featureDoors: Rule = (modules) =>
  modules
    .filter(({ path }) => path.startsWith("app/src/") && !isTestFile(path))
    .flatMap((module) =>
      module.imports.flatMap(({ target, specifier, line }) => {
        const reached = target === null ? undefined : FEATURE.exec(target)?.[1];
        if (reached === undefined || FEATURE.exec(module.path)?.[1] === reached) return [];
        if (/^app\/src\/(ui|lib|api)\//.test(module.path)) {
          return [
            breach(module, line, `${module.path.split("/")[2]} must not import a feature ("${specifier}")`),
          ];
        }
        const door = target === `${reached}/index.ts` || target === `${reached}/index.tsx`;
        return door ? [] : [breach(module, line, `enters ${reached} past its index.ts ("${specifier}")`)];
      }),
    );

const SERVER_FEATURE = /^server\/src\/features\/[^/]+\//;

/** routes → service → repo → db. */
export const serverLayers: Rule = (modules) =>
  modules
    .filter(({ path }) => SERVER_FEATURE.test(path) && !isTestFile(path))
    .flatMap((module) =>
      module.imports.flatMap(({ target, specifier, line }) => {
        const file = module.path.split("/").at(-1)!;
        const reached = target?.split("/").at(-1) ?? "";
        const toDatabase = target?.startsWith("db/") || specifier.startsWith("@linkwright/db");
        if (/^routes/.test(file) && (toDatabase || /^repo/.test(reached))) {
          return [breach(module, line, `routes go through the service, not to "${specifier}"`)];
        }
        if (/^(service|repo)/.test(file) && /^routes/.test(reached)) {
          return [breach(module, line, `${file} must not import routes`)];
        }
        if (/^repo/.test(file) && /^service/.test(reached)) {
          return [breach(module, line, `${file} must not import a service`)];
        }
        return [];
      }),
    );

export const namedExportsOnly: Rule = (modules) =>
  modules.flatMap((module) => {
    const allowed = module.path.startsWith("app/src/app/") || isToolConfig(module.path);
    return module.defaultExportLine === null || allowed
      ? []
      : [breach(module, module.defaultExportLine, "has a default export")];
  });

/** Groups of files that import one another in a ring (Tarjan's strongly connected components). */
export const noCycles: Rule = (modules) => {
  const byPath = new Map(modules.map((module) => [module.path, module]));
  const index = new Map<string, number>();
  const low = new Map<string, number>();
  const stack: string[] = [];
  const onStack = new Set<string>();
  const rings: string[][] = [];
  const visit = (path: string): void => {
    index.set(path, index.size);
    low.set(path, index.get(path)!);
    stack.push(path);
    onStack.add(path);
    for (const { target } of byPath.get(path)!.imports) {
      if (target === null || !byPath.has(target)) continue;
      if (!index.has(target)) {
        visit(target);
        low.set(path, Math.min(low.get(path)!, low.get(target)!));
      } else if (onStack.has(target)) {
        low.set(path, Math.min(low.get(path)!, index.get(target)!));
      }
    }
    if (low.get(path) !== index.get(path)) return;
    const ring = stack.splice(stack.indexOf(path));
    for (const member of ring) onStack.delete(member);
    const importsItself = byPath.get(path)!.imports.some(({ target }) => target === path);
    if (ring.length > 1 || importsItself) rings.push(ring.sort());
  };
  for (const module of modules) if (!index.has(module.path)) visit(module.path);
  return rings.map((ring) => ({ where: ring[0]!, what: `imports in a ring: ${ring.join(" → ")}` }));
};

const LINE_LIMIT = 250;

/** Not a rule but a reminder: files too long to read at one sitting. */
export const longFiles: Rule = (modules) =>
  modules
    .filter(({ path, lineCount }) => !isTestFile(path) && lineCount > LINE_LIMIT)
    .map((module) => ({
      where: module.path,
      what: `has ${module.lineCount} lines (about ${LINE_LIMIT} stays readable)`,
    }));

export const RULES: Readonly<Record<string, Rule>> = {
  "workspaces import only what the picture of arrows allows": workspaceArrows,
  "another package is entered by its name through an open door": packageDoors,
  "a workspace imports only packages that its package.json asks for": declaredDependencies,
  "the engine's folders import only towards geometry": kinematicsFolders,
  "the engine is pure and only solver/linalg.ts imports ml-matrix": kinematicsIsPure,
  "degrees change into radians in units.ts alone": oneDegreeFactor,
  "only app/src/api/client.ts calls fetch": oneFetch,
  "a feature is entered through its index.ts, and never by ui, lib or api": featureDoors,
  "on the server routes call services, services call repos": serverLayers,
  "default exports stand only in routes and tool configurations": namedExportsOnly,
  "no file imports itself in a ring": noCycles,
};
