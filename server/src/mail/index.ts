export { alreadySignedUpMessage, type Message, welcomeMessage } from "./messages.ts";
export { type MailSettings, postMail } from "./outbox.ts";
export { type MailRun, sendDueMail } from "./sendDueMail.ts";
