export { lockDraft } from "./repo.ts";
export { studiesRouter } from "./routes.ts";
export { getStudy } from "./service.ts";
export { readStoredStudy } from "./storedStudy.ts";
