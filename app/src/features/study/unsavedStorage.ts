// What is typed and not yet acknowledged lives on the device too, per person and study, so that a closed tab or an
// empty battery loses nothing.

import { Edit, Id } from "@linkwright/contract";
import { z } from "zod";
import { readStored, removeStored, writeStored } from "@/lib/storage.ts";
import { type Flight, hasUnsaved, type Unsaved } from "./state.ts";

const UnsavedSchema = z.object({
  inFlight: z.object({ id: Id, baseVersion: z.int(), edits: z.array(Edit) }).nullable(),
  pending: z.array(Edit),
});

function keyOf(personId: string, studyId: string): string {
  return `linkwright.unsaved.${personId}.${studyId}`;
}

export function readUnsaved(personId: string, studyId: string): Unsaved | null {
  const stored = readStored(keyOf(personId, studyId));
  if (stored === null) return null;
  const parsed = UnsavedSchema.safeParse(parseJson(stored));
  return parsed.success ? parsed.data : null;
}

/** False when the device will not keep it: the person is told, for then a closed tab would lose it. */
export function keepUnsaved(personId: string, studyId: string, { inFlight, pending }: Unsaved): boolean {
  const key = keyOf(personId, studyId);
  if (hasUnsaved({ inFlight, pending })) return writeStored(key, JSON.stringify({ inFlight, pending }));
  removeStored(key);
  return true;
}

function parseJson(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return null;
  }
}

/** After its acknowledgement, unless the study has been opened and changed again meanwhile. */
export function forgetFlight(personId: string, studyId: string, flight: Flight): void {
  const kept = readUnsaved(personId, studyId);
  if (kept?.inFlight?.id === flight.id && kept.pending.length === 0) removeStored(keyOf(personId, studyId));
}
