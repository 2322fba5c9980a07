// What of an issue goes out: the place and the words always, the value only when it helps and is nobody's secret.

import type { ProblemIssue } from "@linkwright/contract";

/** What is repeated is for finding the place, not for sending it all back. */
const LONGEST_ECHO = 200;

export function presentIssue(issue: ProblemIssue): ProblemIssue {
  const { value, ...rest } = issue;
  const isSecret = issue.path.some((step) => /password/i.test(String(step)));
  const text = JSON.stringify(value);
  return isSecret || text === undefined || text.length > LONGEST_ECHO ? rest : issue;
}
