// What our mails say, in plain text and in HTML that looks like the product.

import { CAUTIONS } from "@linkwright/contract";
import type { MailSettings } from "./settings.ts";

export interface Message {
  readonly to: { readonly name: string; readonly email: string };
  readonly subject: string;
  readonly text: string;
  readonly html: string;
}

export function welcomeMessage(
  to: Message["to"],
  workshopName: string,
  { publicUrl }: Pick<MailSettings, "publicUrl">,
): Message {
  return compose(to, "Welcome to Linkwright", [
    { paragraph: `Hello ${to.name},` },
    { paragraph: `your workshop "${workshopName}" is ready, and you are its owner. Sign in here:` },
    { link: publicUrl },
    { paragraph: "You acknowledged these cautions when you signed up. Keep them in mind:" },
    ...CAUTIONS.map(({ title, text }) => ({ paragraph: `${title}. ${text}` })),
  ]);
}

/** To somebody whose address was used to sign up a second time: nobody else is told that it has an account. */
export function alreadySignedUpMessage(
  to: Message["to"],
  { publicUrl }: Pick<MailSettings, "publicUrl">,
): Message {
  return compose(to, "You already have a Linkwright account", [
    { paragraph: `Hello ${to.name},` },
    {
      paragraph:
        "somebody has just tried to sign up with your e-mail address. You have an account with it already, so nothing was changed. Sign in with the password you have:",
    },
    { link: publicUrl },
    { paragraph: "If it was not you, there is nothing to do: nobody was let in." },
  ]);
}

type Part = { readonly paragraph: string } | { readonly link: string };

const PAPER = "#F4F1EA";
const INK = "#17202E";
const DYE = "#1E3F94";

function compose(to: Message["to"], subject: string, parts: readonly Part[]): Message {
  const text = parts.map((part) => ("link" in part ? part.link : part.paragraph)).join("\n\n");
  const body = parts.map((part) =>
    "link" in part ? htmlLink(part.link) : `<p>${escapeHtml(part.paragraph)}</p>`,
  );
  const html = [
    "<!doctype html>",
    `<html lang="en"><head><meta charset="utf-8"><title>${escapeHtml(subject)}</title></head>`,
    `<body style="margin:0;padding:24px;background:${PAPER};color:${INK};font:16px/1.5 Barlow,Helvetica,Arial,sans-serif">`,
    `<p style="font-size:20px;font-weight:600;color:${DYE}">Linkwright</p>`,
    ...body,
    "</body></html>",
  ].join("\n");
  return { to, subject, text: `${text}\n`, html };
}

function htmlLink(url: string): string {
  const escaped = escapeHtml(url);
  return `<p><a href="${escaped}" style="color:${DYE}">${escaped}</a></p>`;
}

function escapeHtml(text: string): string {
  return text.replace(/[&<>"']/g, (character) => `&#${character.charCodeAt(0)};`);
}
