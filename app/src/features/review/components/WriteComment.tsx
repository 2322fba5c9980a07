import type { RevisionSummary } from "@linkwright/contract";
import { useState } from "react";
import { Button } from "@/ui/Button.tsx";
import { Dialog } from "@/ui/Dialog.tsx";
import { CommentForm } from "./CommentForm.tsx";

interface WriteCommentProps {
  readonly revisions: readonly RevisionSummary[];
  readonly point: string | undefined;
}

/** On a phone the form opens over the comments; coming from a hardpoint it is open already. */
export function WriteComment({ revisions, point }: WriteCommentProps) {
  const [isOpen, setIsOpen] = useState(point !== undefined);
  const close = () => setIsOpen(false);
  return (
    <>
      <Button kind="primary" label="Write a comment" onPress={() => setIsOpen(true)} />
      {isOpen ? (
        <Dialog title="Write a comment" onClose={close}>
          <CommentForm revisions={revisions} point={point} onAdded={close} />
        </Dialog>
      ) : null}
    </>
  );
}
