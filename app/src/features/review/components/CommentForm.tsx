import type { CommentPin, RevisionSummary } from "@linkwright/contract";
import { listHardpoints } from "@linkwright/kinematics";
import { useRef, useState } from "react";
import { StyleSheet } from "react-native";
import { useAddComment } from "@/api/comments.ts";
import { useCurrentPerson, usePreferences } from "@/features/session/index.ts";
import { hardpointInWords, useStudy } from "@/features/study/index.ts";
import { makeId } from "@/lib/ids.ts";
import { useStoredText } from "@/lib/useStoredText.ts";
import { Button } from "@/ui/Button.tsx";
import { DomForm } from "@/ui/dom.tsx";
import { ErrorState } from "@/ui/ErrorState.tsx";
import { Select } from "@/ui/Select.tsx";
import { TextArea } from "@/ui/TextField.tsx";
import { space } from "@/ui/theme/tokens.ts";

const WHOLE_STUDY = "";
const DRAFT = "";
const TEXT_LENGTH = 4000;

interface CommentFormProps {
  readonly revisions: readonly RevisionSummary[];
  /** The hardpoint it is first pinned to. */
  readonly point: string | undefined;
  readonly onAdded?: () => void;
}

export function CommentForm({ revisions, point, onAdded }: CommentFormProps) {
  const { workshopId, studyId, study } = useStudy();
  const { words } = usePreferences();
  const person = useCurrentPerson();
  const [pin, setPin] = useState(point ?? WHOLE_STUDY);
  const [revision, setRevision] = useState(DRAFT);
  const [text, setText] = useStoredText(`comment.${person.id}.${studyId}`);
  const [message, setMessage] = useState<string>();
  const add = useAddComment(workshopId, studyId);
  // The same id until it has arrived, so that sending it again after a lost answer adds no second comment.
  const id = useRef(makeId());

  const submit = async () => {
    if (text.trim() === "") return setMessage("Write what you want to say.");
    setMessage(undefined);
    const body = {
      id: id.current,
      pin: pinOf(pin),
      revision: revision === DRAFT ? null : Number(revision),
      text,
    };
    await add.mutateAsync(body).then(
      () => {
        id.current = makeId();
        setText("");
        onAdded?.();
      },
      () => undefined, // told below; the text stays
    );
  };

  const points = listHardpoints(study.axle).map(({ path }) => ({
    value: path,
    label: hardpointInWords(study.axle, path, words),
  }));
  const shown = [
    { value: DRAFT, label: "The draft" },
    ...revisions.map(({ number }) => ({ value: String(number), label: `Revision ${number}` })),
  ];
  return (
    <DomForm
      aria-label="Write a comment"
      onSubmit={(event) => {
        event.preventDefault();
        void submit();
      }}
      style={styles.form as object}
    >
      <Select
        label="About"
        value={pin}
        options={[{ value: WHOLE_STUDY, label: "The whole study" }, ...points]}
        onChange={setPin}
      />
      {revisions.length > 0 ? (
        <Select label="Looking at" value={revision} options={shown} onChange={setRevision} />
      ) : null}
      <TextArea
        label="Comment"
        value={text}
        onChange={setText}
        rows={4}
        maxLength={TEXT_LENGTH}
        error={message}
      />
      {add.error ? <ErrorState title="The comment was not added" error={add.error} /> : null}
      <Button submit kind="primary" label="Add the comment" busyLabel="Adding…" busy={add.isPending} />
    </DomForm>
  );
}

function pinOf(pin: string): CommentPin {
  return pin === WHOLE_STUDY ? { type: "study" } : { type: "hardpoint", path: pin };
}

const styles = StyleSheet.create({ form: { display: "flex", flexDirection: "column", gap: space.l } });
