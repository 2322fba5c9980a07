export { alreadySignedUpMessage, type Message, welcomeMessage } from "./messages.ts";
export { postMail } from "./outbox.ts";
export { type MailRun, sendDueMail } from "./sendDueMail.ts";
export type { MailSettings } from "./settings.ts";
