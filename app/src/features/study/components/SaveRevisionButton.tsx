import { useState } from "react";
import { useWorkshop } from "@/features/session/index.ts";
import { Button } from "@/ui/Button.tsx";
import { SaveRevisionDialog } from "./SaveRevisionDialog.tsx";

/** Only for whoever may save revisions. */
export function SaveRevisionButton({ compact }: { compact?: boolean }) {
  const { may } = useWorkshop();
  const [isOpen, setIsOpen] = useState(false);
  if (!may("revision.save")) return null;
  return (
    <>
      <Button
        kind={compact ? "quiet" : "primary"}
        label={compact ? "Revision" : "Save revision"}
        accessibleLabel="Save revision"
        onPress={() => setIsOpen(true)}
      />
      {isOpen ? <SaveRevisionDialog onClose={() => setIsOpen(false)} /> : null}
    </>
  );
}
