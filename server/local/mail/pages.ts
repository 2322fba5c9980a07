// The pages on which the local mail is read. A message is a stranger's text: everything is escaped, and its HTML stays
// in a sandbox that runs no script and loads nothing.
import type { Message } from "./store.ts";

const STYLE = `
  :root { color-scheme: light dark; --ground: #f4f1ea; --panel: #fff; --ink: #17202e; --rule: #d5d0c4; --dye: #1e3f94; }
  @media (prefers-color-scheme: dark) {
    :root { --ground: #0f1830; --panel: #182444; --ink: #edf1f8; --rule: #33436b; --dye: #8fb0ff; }
  }
  body { margin: 0; background: var(--ground); color: var(--ink); font: 16px/1.5 system-ui, sans-serif; }
  main { max-width: 56rem; margin: 0 auto; padding: 1rem; }
  a { color: var(--dye); }
  h1 { font-size: 1.5rem; overflow-wrap: anywhere; }
  ul { list-style: none; margin: 0; padding: 0; border-top: 1px solid var(--rule); }
  li a { display: block; min-height: 44px; padding: .5rem 0; border-bottom: 1px solid var(--rule); overflow-wrap: anywhere; }
  dl { display: grid; grid-template-columns: max-content 1fr; gap: 0 1rem; }
  dd { margin: 0; overflow-wrap: anywhere; }
  pre { background: var(--panel); border: 1px solid var(--rule); padding: 1rem; white-space: pre-wrap; overflow-wrap: anywhere; }
  iframe { width: 100%; height: 60vh; border: 1px solid var(--rule); background: #fff; }`;

export function escapeHtml(text: string): string {
  const entities: Record<string, string> = {
    "&": "&amp;",
    "<": "&lt;",
    ">": "&gt;",
    '"': "&quot;",
    "'": "&#39;",
  };
  return text.replace(/[&<>"']/g, (character) => entities[character] as string);
}

/** Addresses in plain text become links, as a mail program would make them. */
function textWithLinks(text: string): string {
  const parts = text.split(/(https?:\/\/[^\s<>"']+)/);
  const link = (url: string) =>
    `<a href="${escapeHtml(url)}" target="_blank" rel="noopener noreferrer">${escapeHtml(url)}</a>`;
  return parts.map((part, index) => (index % 2 === 1 ? link(part) : escapeHtml(part))).join("");
}

function page(title: string, body: string): string {
  return `<!doctype html>
<html lang="en-GB"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width, initial-scale=1">
<title>${escapeHtml(title)}</title><style>${STYLE}</style></head><body><main>${body}</main></body></html>`;
}

export function listPage(messages: readonly Message[]): string {
  const item = (message: Message) =>
    `<li><a href="/messages/${message.id}">${escapeHtml(message.subject || "(no subject)")}<br>
     <small>to ${escapeHtml(message.to)} · <time>${message.receivedAt}</time></small></a></li>`;
  const body = messages.length === 0 ? "<p>No mail yet.</p>" : `<ul>${messages.map(item).join("")}</ul>`;
  return page(
    "Local mail",
    `<h1>Local mail</h1><p>What Linkwright has sent from this machine. Nothing leaves it. <a href="/">Look again</a></p>${body}`,
  );
}

export function messagePage(message: Message): string {
  const html = message.html
    ? `<h2>As HTML</h2><iframe title="The message as HTML" sandbox="allow-popups" src="/messages/${message.id}/html"></iframe>`
    : "";
  const attachments = message.attachments
    .map((part) => `<dt>Attached</dt><dd>${escapeHtml(part.name)} (${part.bytes} bytes)</dd>`)
    .join("");
  return page(
    message.subject,
    `<p><a href="/">All mail</a></p><h1>${escapeHtml(message.subject || "(no subject)")}</h1>
     <dl><dt>From</dt><dd>${escapeHtml(message.from)}</dd><dt>To</dt><dd>${escapeHtml(message.to)}</dd>
     <dt>Received</dt><dd><time>${message.receivedAt}</time></dd>${attachments}</dl>
     <pre>${textWithLinks(message.text)}</pre>${html}`,
  );
}

export function missingPage(): string {
  return page("Not found", `<h1>Not found</h1><p>There is no such message. <a href="/">All mail</a></p>`);
}
