import { isProblem } from "./problem.ts";

/** Hands the server's findings to the fields they speak of; tells which ones belong to no field of the form. */
export function spreadIssues<Name extends string>(
  error: unknown,
  names: readonly Name[],
  tell: (name: Name, message: string) => void,
): void {
  if (!isProblem(error)) return;
  for (const { path, problem, hint } of error.issues) {
    const name = names.find((candidate) => candidate === path[0]);
    if (name !== undefined) tell(name, `${problem} ${hint}`);
  }
}
