export { SaveRevisionButton } from "./components/SaveRevisionButton.tsx";
export type { Change, EditValue } from "./edits.ts";
export { groupInWords, hardpointInWords, pathInWords } from "./pathInWords.ts";
export { type StudyDocument, useStudy } from "./StudyContext.tsx";
export { StudyShell } from "./StudyShell.tsx";
