// Study documents as they come out of the database.

import { StudySchema } from "@linkwright/contract";
import type { Study } from "@linkwright/kinematics";

/** Everything stored was parsed before it went in, so what does not fit is a bug and not bad input. */
export function readStoredStudy(stored: unknown): Study {
  const parsed = StudySchema.safeParse(stored);
  if (!parsed.success) throw new Error(`a stored study does not fit its schema: ${parsed.error.message}`);
  return parsed.data;
}
