// One save, from the edits on their way to what the open study is told about it.

import type { StudyAnswer } from "@linkwright/contract";
import type { QueryClient } from "@tanstack/react-query";
import { fetchStudy, saveEdits, studyQuery } from "@/api/studies.ts";
import { ApiProblem, isPassing, isProblem } from "@/lib/problem.ts";
import type { Flight, StudyAction } from "./state.ts";

export interface SendPlace {
  readonly client: QueryClient;
  readonly workshopId: string;
  readonly studyId: string;
}

/** Never rejects. What is known of the study elsewhere on the page is brought up to date. */
export async function sendEdits(place: SendPlace, flight: Flight): Promise<StudyAction> {
  const { id, baseVersion, edits } = flight;
  try {
    const saved = await saveEdits(place.workshopId, place.studyId, { id, baseVersion, edits: [...edits] });
    remember(place, saved);
    return { type: "editsSaved", id, ...saved };
  } catch (error) {
    const problem = asProblem(error);
    if (problem.conflict) return conflictOutcome(place, flight, problem);
    const isTransient =
      isPassing(problem) || isProblem(problem, "not_signed_in", "too_many_attempts", "internal");
    return { type: isTransient ? "saveDelayed" : "saveRefused", id, problem };
  }
}

/** A conflict is shown on the draft as it stands now, so that is fetched first. */
async function conflictOutcome(place: SendPlace, { id }: Flight, problem: ApiProblem): Promise<StudyAction> {
  try {
    const { version, draft } = await fetchStudy(place.workshopId, place.studyId);
    remember(place, { version, draft });
    return { type: "conflictArrived", conflict: problem.conflict ?? { version, edits: [] }, version, draft };
  } catch (error) {
    return { type: "saveDelayed", id, problem: asProblem(error) };
  }
}

function remember({ client, workshopId, studyId }: SendPlace, saved: Pick<StudyAnswer, "version" | "draft">) {
  client.setQueryData(studyQuery(workshopId, studyId).queryKey, (known) =>
    known ? { ...known, ...saved } : known,
  );
}

function asProblem(error: unknown): ApiProblem {
  if (error instanceof ApiProblem) return error;
  const detail = error instanceof Error ? error.message : "The cause is not known.";
  return new ApiProblem({ kind: "unexpected_answer", title: "Not saved", detail });
}
