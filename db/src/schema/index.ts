export { builds } from "./builds.ts";
export { comments } from "./comments.ts";
export { outbox, rateLimits } from "./mail.ts";
export { memberships, people, sessions, workshops } from "./people.ts";
export { revisions } from "./revisions.ts";
export { sheets } from "./sheets.ts";
export { draftEdits, studies } from "./studies.ts";
