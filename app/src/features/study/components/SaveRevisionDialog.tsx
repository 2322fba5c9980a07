import { type RevisionAnswer, shortHash } from "@linkwright/contract";
import { useRouter } from "expo-router";
import { useState } from "react";
import { useSaveRevision } from "@/api/revisions.ts";
import { useCurrentPerson } from "@/features/session/index.ts";
import { makeId } from "@/lib/ids.ts";
import { useStoredText } from "@/lib/useStoredText.ts";
import { Button } from "@/ui/Button.tsx";
import { Dialog } from "@/ui/Dialog.tsx";
import { ErrorState } from "@/ui/ErrorState.tsx";
import { Notice } from "@/ui/Notice.tsx";
import { Figure, Text } from "@/ui/Text.tsx";
import { TextArea } from "@/ui/TextField.tsx";
import { useSaving, useStudy } from "../StudyContext.tsx";
import { hasUnsaved } from "../state.ts";

const NOTE_LENGTH = 2000;

export function SaveRevisionDialog({ onClose }: { onClose: () => void }) {
  const { workshopId, studyId } = useStudy();
  const { state, issues } = useSaving();
  const { id: personId } = useCurrentPerson();
  const [note, setNote] = useStoredText(`revision.${personId}.${studyId}`);
  const [id] = useState(makeId);
  const save = useSaveRevision(workshopId, studyId);
  const isWaiting = hasUnsaved(state);
  const isBarred = issues.length > 0 || (state.trouble !== null && state.trouble.status !== "impossible");
  if (save.data) return <SavedNotice revision={save.data} onClose={onClose} />;
  const submit = () =>
    save.mutateAsync({ id, version: state.version, note }).then(
      () => setNote(""),
      () => undefined,
    );
  return (
    <Dialog
      title="Save a revision"
      onClose={onClose}
      actions={
        <>
          <Button label="Cancel" onPress={onClose} />
          <Button
            kind="primary"
            label="Save revision"
            busyLabel={isWaiting ? "Waiting for the last changes…" : "Saving…"}
            busy={isWaiting && !isBarred}
            disabled={isBarred}
            onPress={submit}
          />
        </>
      }
    >
      <Text>
        A revision is the whole study as it stands now. It gets the next number and a code over its content,
        and never changes again. Sheets are made from revisions.
      </Text>
      <TextArea
        label="Note"
        help="What changed, and why. May stay empty."
        value={note}
        onChange={setNote}
        maxLength={NOTE_LENGTH}
      />
      {isBarred ? (
        <Notice kind="fault" title="Not yet">
          The draft has changes that are not saved. See the notice above the page; once they are saved the
          revision can be.
        </Notice>
      ) : null}
      {save.error ? <ErrorState title="The revision was not saved" error={save.error} /> : null}
    </Dialog>
  );
}

function SavedNotice({ revision, onClose }: { revision: RevisionAnswer; onClose: () => void }) {
  const { buildId, studyId } = useStudy();
  const router = useRouter();
  const toSheets = () => {
    onClose();
    router.navigate({ pathname: "/builds/[buildId]/studies/[studyId]/sheets", params: { buildId, studyId } });
  };
  return (
    <Dialog
      title={`Revision ${revision.number} is saved`}
      onClose={onClose}
      actions={
        <>
          <Button label="Make a sheet of it" onPress={toSheets} />
          <Button kind="primary" label="Go on" onPress={onClose} />
        </>
      }
    >
      <Text>
        {"Its code is "}
        <Figure>{shortHash(revision.hash)}</Figure>
        {
          ". The same code on a sheet means the very same numbers. It is saved, not released: sheets of it say so."
        }
      </Text>
    </Dialog>
  );
}
