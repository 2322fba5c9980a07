export interface MailSettings {
  /** Where people reach the web client: mails link to it. */
  readonly publicUrl: string;
  /** As in a mail's head: `Linkwright <mail@example.org>` or the address alone. */
  readonly from: string;
}
