import type { Role } from "@linkwright/contract";
import { useWorkshop } from "@/features/session/index.ts";
import { useStudy } from "@/features/study/index.ts";
import { Notice } from "@/ui/Notice.tsx";

const MAY_INSTEAD: Readonly<Record<Role, string>> = {
  owner: "",
  engineer: "",
  fabricator: "You can make sheets of its revisions, and comment under Review.",
  reviewer: "You can comment under Review.",
};

/** Why nothing can be typed here, for those whose role reads only. */
export function ReadOnlyNote() {
  const { mayEdit } = useStudy();
  const { role } = useWorkshop();
  if (mayEdit) return null;
  return (
    <Notice kind="info" title="You read this study">
      {`Engineers and owners change it; you are here as a ${role}. ${MAY_INSTEAD[role]}`}
    </Notice>
  );
}
