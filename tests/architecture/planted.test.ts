// The watchdog is watched: forbidden arrows planted in made-up sources must be seen, and lawful ones must not.

import { describe, test } from "vitest";
import { expect } from "../helpers/matchers.ts";
import { parseModules, type Sources } from "./modules.ts";
import {
  declaredDependencies,
  featureDoors,
  kinematicsFolders,
  kinematicsIsPure,
  longFiles,
  namedExportsOnly,
  noCycles,
  oneDegreeFactor,
  oneFetch,
  packageDoors,
  RULES,
  type Rule,
  serverLayers,
  workspaceArrows,
} from "./rules.ts";

const manifest = (name: string, dependencies: readonly string[], exports?: Record<string, string>): string =>
  JSON.stringify({
    name: `@linkwright/${name}`,
    ...(exports ? { exports } : {}),
    dependencies: Object.fromEntries(dependencies.map((dependency) => [dependency, "1.0.0"])),
  });

const KINEMATICS = "@linkwright/kinematics";
const CONTRACT = "@linkwright/contract";
const DB = "@linkwright/db";

/** A small lawful repository. */
const LAWFUL: Readonly<Record<string, string>> = {
  "package.json": JSON.stringify({ name: "linkwright", devDependencies: { vitest: "1.0.0" } }),
  "packages/kinematics/package.json": manifest("kinematics", ["ml-matrix"], { ".": "./src/index.ts" }),
  "packages/contract/package.json": manifest("contract", [KINEMATICS, "zod"], { ".": "./src/index.ts" }),
  "packages/cli/package.json": manifest("cli", [CONTRACT, KINEMATICS]),
  "db/package.json": manifest("db", [CONTRACT, "pg"], { ".": "./src/index.ts" }),
  "server/package.json": manifest("server", [CONTRACT, KINEMATICS, DB], { "./app": "./src/app.ts" }),
  "app/package.json": manifest("app", [CONTRACT, KINEMATICS]),
  "tests/package.json": manifest("tests", [CONTRACT, KINEMATICS, DB, "@linkwright/server"]),
  "e2e/package.json": manifest("e2e", [CONTRACT]),
  "packages/kinematics/src/index.ts":
    'export { sweep } from "./sweeps/sweep.ts";\nexport type { Axle } from "./model/axle.ts";\n',
  "packages/kinematics/src/units.ts": "export const degPerRad = 180 / Math.PI;\n",
  "packages/kinematics/src/geometry/vec3.ts": "export const zero = 0;\n",
  "packages/kinematics/src/model/axle.ts":
    'import { zero } from "../geometry/vec3.ts";\nexport interface Axle { name: string }\nexport const none = zero;\n',
  "packages/kinematics/src/solver/linalg.ts":
    'import { Matrix } from "ml-matrix";\nexport const one = () => new Matrix(1, 1);\n',
  "packages/kinematics/src/sweeps/sweep.ts":
    'import { none } from "../model/axle.ts";\nimport { one } from "../solver/linalg.ts";\nexport const sweep = () => [none, one()];\n',
  "packages/contract/src/index.ts": `import type { Axle } from "${KINEMATICS}";\nimport { z } from "zod";\nexport const AxleSchema = z.custom<Axle>();\n`,
  "db/src/index.ts": `import pg from "pg";\nexport { AxleSchema } from "${CONTRACT}";\nexport const pool = pg;\n`,
  "server/src/app.ts": 'import { routes } from "./features/studies/routes.ts";\nexport const app = routes;\n',
  "server/src/features/studies/routes.ts":
    'import { list } from "./service.ts";\nexport const routes = list;\n',
  "server/src/features/studies/service.ts":
    'import { rows } from "./repo.ts";\nexport const list = () => rows;\n',
  "server/src/features/studies/repo.ts": `import { pool } from "${DB}";\nexport const rows = pool;\n`,
  "app/src/app/index.tsx":
    'import { Points } from "@/features/points/index.ts";\nexport default function Route() { return Points; }\n',
  "app/src/features/points/index.ts": 'export { Points } from "./Points.ts";\n',
  "app/src/features/points/Points.ts":
    'import { Curve } from "../curves/index.ts";\nimport { Button } from "@/ui/Button.ts";\nexport const Points = [Curve, Button];\n',
  "app/src/features/curves/index.ts": 'export { Curve } from "./Curve.ts";\n',
  "app/src/features/curves/Curve.ts": 'import { get } from "@/api/client.ts";\nexport const Curve = get;\n',
  "app/src/ui/Button.ts": "export const Button = 1;\n",
  "app/src/api/client.ts": 'export const get = () => fetch("/api");\n',
  "app/metro.config.js": "export default {};\n",
  "tests/published/a.test.ts": `import { sweep } from "${KINEMATICS}";\nimport { test } from "vitest";\ntest("a", sweep);\n`,
};

function breachesOf(rule: Rule, planted: Readonly<Record<string, string>> = {}): string[] {
  const sources: Sources = new Map(Object.entries({ ...LAWFUL, ...planted }));
  return rule(parseModules(sources), sources).map(({ where, what }) => `${where} ${what}`);
}

test.each(Object.entries(RULES))("a lawful repository passes: %s", (_name, rule) => {
  expect(breachesOf(rule)).toEqual([]);
});

const PLANTS: readonly { rule: Rule; what: string; path: string; text: string; line?: number }[] = [
  {
    rule: workspaceArrows,
    what: "the client imports the server",
    path: "app/src/features/points/Points.ts",
    text: 'import { app } from "@linkwright/server/app";\n',
  },
  {
    rule: workspaceArrows,
    what: "the client imports a type of the database",
    path: "app/src/features/points/Points.ts",
    text: `import type { Row } from "${DB}";\n`,
  },
  {
    rule: workspaceArrows,
    what: "the engine imports the contract",
    path: "packages/kinematics/src/model/axle.ts",
    text: `\nexport { AxleSchema } from "${CONTRACT}";\n`,
    line: 2,
  },
  {
    rule: workspaceArrows,
    what: "the server imports the client by path",
    path: "server/src/features/studies/service.ts",
    text: 'const Button = await import("../../../../app/src/ui/Button.ts");\n',
  },
  {
    rule: workspaceArrows,
    what: "product code imports the tests",
    path: "packages/cli/src/main.ts",
    text: 'import "../../../tests/published/a.test.ts";\n',
  },
  {
    rule: workspaceArrows,
    what: "end-to-end tests import the database",
    path: "e2e/specs/a.spec.ts",
    text: `import { pool } from "${DB}";\n`,
  },
  {
    rule: packageDoors,
    what: "a deep import by path",
    path: "tests/published/b.test.ts",
    text: 'import { zero } from "../../packages/kinematics/src/geometry/vec3.ts";\n',
  },
  {
    rule: packageDoors,
    what: "a deep import by name",
    path: "packages/cli/src/main.ts",
    text: `import { zero } from "${KINEMATICS}/src/geometry/vec3.ts";\n`,
  },
  {
    rule: declaredDependencies,
    what: "a package that only happens to be installed",
    path: "packages/cli/src/main.ts",
    text: 'import { z } from "zod";\n',
  },
  {
    rule: kinematicsFolders,
    what: "the solver imports the model",
    path: "packages/kinematics/src/solver/newton.ts",
    text: '// why\nimport type { Axle } from "../model/axle.ts";\nexport type A = Axle;\n',
    line: 2,
  },
  {
    rule: kinematicsFolders,
    what: "the model imports a sweep",
    path: "packages/kinematics/src/model/axle.ts",
    text: 'export { sweep } from "../sweeps/sweep.ts";\n',
  },
  {
    rule: kinematicsFolders,
    what: "a folder imports the package's own door",
    path: "packages/kinematics/src/sweeps/again.ts",
    text: 'export { sweep } from "../index.ts";\n',
  },
  {
    rule: kinematicsFolders,
    what: "a folder nobody drew",
    path: "packages/kinematics/src/extras/x.ts",
    text: "export const x = 1;\n",
  },
  {
    rule: kinematicsIsPure,
    what: "ml-matrix outside linalg.ts",
    path: "packages/kinematics/src/sweeps/sweep.ts",
    text: 'import { Matrix } from "ml-matrix";\nexport const sweep = () => new Matrix(1, 1);\n',
  },
  {
    rule: kinematicsIsPure,
    what: "the engine reads a file",
    path: "packages/kinematics/src/model/axle.ts",
    text: 'import { readFileSync } from "node:fs";\nexport const none = readFileSync("x");\n',
  },
  {
    rule: kinematicsIsPure,
    what: "the engine throws dice",
    path: "packages/kinematics/src/model/axle.ts",
    text: "\n\nexport const none = Math.random();\n",
    line: 3,
  },
  {
    rule: kinematicsIsPure,
    what: "the engine looks at the clock",
    path: "packages/kinematics/src/model/axle.ts",
    text: "export const none = new Date();\n",
  },
  {
    rule: oneDegreeFactor,
    what: "a conversion beside units.ts",
    path: "packages/kinematics/src/geometry/vec3.ts",
    text: "export const zero = (x: number) => (x * 180) / Math.PI;\nexport const two = (x: number) => x * (Math.PI / 180);\n",
    line: 2,
  },
  {
    rule: oneFetch,
    what: "a screen fetches",
    path: "app/src/features/curves/Curve.ts",
    text: 'export const Curve = () => window.fetch("/api");\n',
  },
  {
    rule: featureDoors,
    what: "a feature walks past a sibling's door",
    path: "app/src/features/points/Points.ts",
    text: 'import { Curve } from "@/features/curves/Curve.ts";\n',
  },
  {
    rule: featureDoors,
    what: "a route walks past a feature's door",
    path: "app/src/app/index.tsx",
    text: 'const Lazy = () => import("../features/curves/Curve.ts");\n',
  },
  {
    rule: featureDoors,
    what: "ui imports a feature, even by its door",
    path: "app/src/ui/Button.ts",
    text: 'export { Curve } from "@/features/curves/index.ts";\n',
  },
  {
    rule: serverLayers,
    what: "routes go to the repo",
    path: "server/src/features/studies/routes.ts",
    text: 'import { rows } from "./repo.ts";\n',
  },
  {
    rule: serverLayers,
    what: "routes go to the database",
    path: "server/src/features/studies/routes.ts",
    text: `import { pool } from "${DB}";\n`,
  },
  {
    rule: namedExportsOnly,
    what: "a default export of a component",
    path: "app/src/ui/Button.ts",
    text: "export default function Button() {}\n",
  },
  {
    rule: namedExportsOnly,
    what: "a default export by another name",
    path: "packages/contract/src/extra.ts",
    text: "const a = 1;\nexport { a as default };\n",
    line: 2,
  },
];

describe("a planted breach is seen", () => {
  test.each(PLANTS)("$what", ({ rule, path, text, line = 1 }) => {
    const breaches = breachesOf(rule, { [path]: text });
    expect(breaches).toHaveLength(1);
    expect(breaches[0]).toContain(`${path}:${line} `);
  });

  test("two files that import one another, with every member named", () => {
    const breaches = breachesOf(noCycles, {
      "packages/kinematics/src/model/a.ts": 'import "./b.ts";\n',
      "packages/kinematics/src/model/b.ts": 'import "./c.ts";\n',
      "packages/kinematics/src/model/c.ts": 'import type { A } from "./a.ts";\n',
    });
    expect(breaches).toHaveLength(1);
    for (const name of ["a.ts", "b.ts", "c.ts"]) expect(breaches[0]).toContain(name);
  });

  test("a file of 251 lines is named and one of 250 is not", () => {
    const lines = (count: number): string => "//\n".repeat(count);
    expect(breachesOf(longFiles, { "app/src/ui/Long.ts": lines(250) })).toEqual([]);
    expect(breachesOf(longFiles, { "app/src/ui/Long.ts": lines(251) })).toHaveLength(1);
  });
});
