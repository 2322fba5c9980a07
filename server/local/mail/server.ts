// A real SMTP server that delivers to files instead of to people, and the pages on which they are read.
import { createServer, type IncomingMessage, type Server, type ServerResponse } from "node:http";
import { SMTPServer } from "smtp-server";
import { listPage, messagePage, missingPage } from "./pages.ts";
import type { MailStore } from "./store.ts";

const LARGEST_MESSAGE_BYTES = 25 * 1024 * 1024; // what large mail providers take as well
const LISTED = 200;

const PAGE_POLICY =
  "default-src 'none'; style-src 'unsafe-inline'; frame-src 'self'; base-uri 'none'; form-action 'none'";
const HTML_POLICY = "default-src 'none'; style-src 'unsafe-inline'; img-src data:; sandbox allow-popups";

export function createSmtpServer(store: MailStore): SMTPServer {
  return new SMTPServer({
    authOptional: true,
    disabledCommands: ["STARTTLS"],
    disableReverseLookup: true,
    size: LARGEST_MESSAGE_BYTES,
    onData(stream, _session, done) {
      store.save(stream).then(
        (id) => done(null, `Kept as ${id}`),
        (error: Error) => done(error),
      );
    },
  });
}

function send(response: ServerResponse, status: number, type: string, policy: string, body: string): void {
  response.writeHead(status, {
    "content-type": `${type}; charset=utf-8`,
    "content-security-policy": policy,
    "cache-control": "no-store",
    "referrer-policy": "no-referrer",
    "x-content-type-options": "nosniff",
  });
  response.end(body);
}

/** Only by a loopback name: otherwise a web page elsewhere could read the mail through a name it points at us. */
function isLoopback(host: string | undefined): boolean {
  return /^(127\.0\.0\.1|localhost)(:\d+)?$/.test(host ?? "");
}

async function answer(store: MailStore, request: IncomingMessage, response: ServerResponse): Promise<void> {
  const html = (status: number, body: string) => send(response, status, "text/html", PAGE_POLICY, body);
  if (!isLoopback(request.headers.host))
    return send(response, 403, "text/plain", PAGE_POLICY, "Open this page by 127.0.0.1.");
  const { pathname } = new URL(request.url ?? "/", "http://127.0.0.1");
  if (pathname === "/") return html(200, listPage(await store.list(LISTED)));
  if (pathname === "/messages.json") {
    return send(response, 200, "application/json", PAGE_POLICY, JSON.stringify(await store.list(LISTED)));
  }
  const [, id, asHtml] = /^\/messages\/([\d-]+)(\/html)?$/.exec(pathname) ?? [];
  const message = id ? await store.find(id) : null;
  if (!message) return html(404, missingPage());
  if (!asHtml) return html(200, messagePage(message));
  if (message.html === null) return html(404, missingPage());
  send(response, 200, "text/html", HTML_POLICY, `<base target="_blank">${message.html}`);
}

export function createMailPages(store: MailStore): Server {
  return createServer((request, response) => {
    answer(store, request, response).catch((error: Error) => {
      send(response, 500, "text/plain", PAGE_POLICY, `The mail cannot be read: ${error.message}`);
    });
  });
}
