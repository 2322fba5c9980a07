import { useQueryClient } from "@tanstack/react-query";
import { type Dispatch, useEffect, useRef } from "react";
import { makeId } from "@/lib/ids.ts";
import { sendEdits } from "./sendEdits.ts";
import { type Flight, isReadyToSave, type OpenStudy, type StudyAction } from "./state.ts";
import { forgetFlight, keepUnsaved } from "./unsavedStorage.ts";

/** After the last change; long enough for a run of steps to travel as one save. */
const QUIET_MS = 700;
const FIRST_RETRY_MS = 2_000;
const LONGEST_RETRY_MS = 30_000;

interface AutosaveOptions {
  readonly workshopId: string;
  readonly personId: string;
  readonly studyId: string;
  readonly state: OpenStudy;
  readonly dispatch: Dispatch<StudyAction>;
  /** False while the draft is not possible as it stands: the server would refuse it. */
  readonly isSound: boolean;
}

function retryDelayMs(attempt: number): number {
  return attempt === 0 ? 0 : Math.min(LONGEST_RETRY_MS, FIRST_RETRY_MS * 2 ** (attempt - 1));
}

/** Saves what is pending once the person pauses, and again until the server has acknowledged it. */
export function useAutosave(options: AutosaveOptions): void {
  const { workshopId, studyId, state, dispatch, isSound } = options;
  const { inFlight, pending, trouble } = state;
  const client = useQueryClient();
  const sending = useRef<Flight | null>(null);
  const isReady = isReadyToSave(state) && isSound;
  const attempt = trouble?.status === "delayed" ? trouble.attempt : 0;

  // biome-ignore lint/correctness/useExhaustiveDependencies: every new change starts the quiet time anew
  useEffect(() => {
    if (!isReady) return;
    const timer = setTimeout(() => dispatch({ type: "saveStarted", id: makeId() }), QUIET_MS);
    return () => clearTimeout(timer);
  }, [isReady, pending, dispatch]);

  useEffect(() => {
    if (!inFlight || sending.current === inFlight) return;
    const send = async () => {
      stopWaiting();
      sending.current = inFlight;
      const action = await sendEdits({ client, workshopId, studyId }, inFlight);
      sending.current = null;
      dispatch(action);
    };
    const timer = setTimeout(send, retryDelayMs(attempt));
    // Back on the network there is no reason to wait on.
    window.addEventListener("online", send);
    const stopWaiting = () => {
      clearTimeout(timer);
      window.removeEventListener("online", send);
    };
    return stopWaiting;
  }, [inFlight, attempt, client, workshopId, studyId, dispatch]);

  useSendOnLeave({ ...options, isReady });
}

/** Whoever leaves the study within the quiet time does not wait for it. */
function useSendOnLeave(options: AutosaveOptions & { readonly isReady: boolean }) {
  const client = useQueryClient();
  const latest = useRef(options);
  latest.current = options;
  useEffect(
    () => () => {
      const { isReady, state, workshopId, personId, studyId } = latest.current;
      if (!isReady) return;
      const flight = { id: makeId(), baseVersion: state.version, edits: state.pending };
      // Kept under its id first: opened again before the answer is in, the study sends the very same save.
      keepUnsaved(personId, studyId, { inFlight: flight, pending: [] });
      void sendEdits({ client, workshopId, studyId }, flight).then((action) => {
        if (action.type === "editsSaved") forgetFlight(personId, studyId, flight);
      });
    },
    [client],
  );
}
