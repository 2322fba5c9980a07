// A document from a file: an axle, or a study for its axle.

import { readFile } from "node:fs/promises";
import { resolve } from "node:path";
import { type Parsed, parseAxle, parseStudy } from "@linkwright/contract";
import { type Axle, formatPath, type Issue, STUDY_FORMAT } from "@linkwright/kinematics";
import { BadInput } from "./badInput.ts";

/** The axle in `file`, which may hold an axle or a study. Throws BadInput with every issue. */
export async function readAxle(file: string): Promise<Axle> {
  const json = await readJson(file);
  if (isStudy(json)) return accept(file, parseStudy(json)).axle;
  return accept(file, parseAxle(json));
}

async function readJson(file: string): Promise<unknown> {
  // npm runs scripts in the project's root and tells here where the caller stood.
  const path = resolve(process.env.INIT_CWD ?? process.cwd(), file);
  let text: string;
  try {
    text = await readFile(path, "utf8");
  } catch (error) {
    throw new BadInput([`${file}: cannot be read (${(error as NodeJS.ErrnoException).code}).`]);
  }
  try {
    return JSON.parse(text);
  } catch (error) {
    throw new BadInput([`${file}: not JSON: ${(error as SyntaxError).message}.`]);
  }
}

function isStudy(json: unknown): boolean {
  return typeof json === "object" && json !== null && "format" in json && json.format === STUDY_FORMAT;
}

function accept<T>(file: string, parsed: Parsed<T>): T {
  if (parsed.ok) return parsed.value;
  throw new BadInput(parsed.issues.map((issue) => `${file}: ${tellIssue(issue)}`));
}

function tellIssue({ path, value, problem, hint }: Issue): string {
  const found = value === undefined ? "" : ` Found: ${JSON.stringify(value)}.`;
  return `${formatPath(path)}: ${problem} ${hint}${found}`;
}
