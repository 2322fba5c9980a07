// Mail from the outbox to the mail server: sent once, tried again when it must be, never lost.

import { randomUUID } from "node:crypto";
import { authRoutes } from "@linkwright/contract";
import { connect, outbox } from "@linkwright/db";
import { quietLog } from "@linkwright/server/log";
import { type MailRun, sendDueMail } from "@linkwright/server/mail";
import { eq } from "drizzle-orm";
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, test } from "vitest";
import { MAIL_FROM, PUBLIC_URL, serveApi } from "./support/api.ts";
import { createClient } from "./support/client.ts";
import { type MailServer, startMailServer } from "./support/fakes.ts";

const api = serveApi();
let server: MailServer;

beforeAll(async () => {
  server = await startMailServer();
});

afterAll(() => server?.stop());

// Each test has the outbox to itself.
beforeEach(async () => {
  await api()
    .connection.db.update(outbox)
    .set({ sentAt: new Date(0), givenUpAt: null });
});

afterEach(() => {
  server.refuse = null;
});

const HOUR_MS = 60 * 60 * 1000;

function run(change: Partial<MailRun> = {}): MailRun {
  const { db } = api().connection;
  return {
    db,
    transport: server.transport,
    from: MAIL_FROM,
    now: () => new Date(),
    log: quietLog,
    ...change,
  };
}

/** A clock that has moved on. */
const later = (ms: number) => run({ now: () => new Date(Date.now() + ms) });

async function signUp(name = "Nell Shaw"): Promise<string> {
  const personId = randomUUID();
  const email = `${personId}@example.org`;
  await createClient(api().url).call(
    authRoutes.signUp,
    {},
    {
      personId,
      workshopId: randomUUID(),
      name,
      workshopName: "Nell's <arches>",
      email,
      password: "ten letters and more",
      cautionsAcknowledged: true,
    },
  );
  return email;
}

const rowFor = async (email: string) =>
  (await api().connection.db.select().from(outbox).where(eq(outbox.toAddress, email)))[0]!;
const receivedBy = (email: string) =>
  server.received.filter(({ to }) => [to].flat().some((address) => address?.text.includes(email)));

describe("a welcome mail", () => {
  test("goes out with its Message-ID, to the person, in plain text and in HTML", async () => {
    const email = await signUp();
    expect(await sendDueMail(run())).toBe(1);
    const [mail] = receivedBy(email);
    const row = await rowFor(email);
    expect(mail!.messageId).toBe(row.messageId);
    expect(row.messageId).toMatch(/^<[0-9a-f-]{36}@linkwright\.test>$/);
    expect(mail!.from!.text).toBe('"Linkwright" <mail@linkwright.test>');
    expect(mail!.subject).toBe("Welcome to Linkwright");
    expect(mail!.text).toContain(`Nell's <arches>`);
    expect(mail!.text).toContain(PUBLIC_URL);
    expect(mail!.html).toContain("Nell&#39;s &#60;arches&#62;");
    expect(row.sentAt).not.toBeNull();
  });

  test("goes out once, however often the outbox is gone through", async () => {
    const email = await signUp();
    await sendDueMail(run());
    await sendDueMail(run());
    await sendDueMail(later(24 * HOUR_MS));
    expect(receivedBy(email)).toHaveLength(1);
  });

  test("goes out once when several workers look at the same moment", async () => {
    const emails = await Promise.all([signUp(), signUp(), signUp()]);
    const others = connect({ url: api().database.appUrl, poolSize: 3 });
    const counts = await Promise.all([1, 2, 3].map(() => sendDueMail(run({ db: others.db }))));
    await others.close();
    expect(counts.reduce((sum, count) => sum + count)).toBe(3);
    for (const email of emails) expect(receivedBy(email)).toHaveLength(1);
  });

  test("puts no head of its own into the mail, whatever the name is", async () => {
    const email = await signUp('Eve" <eve@elsewhere.example>, Bcc: all');
    await sendDueMail(run());
    const [mail] = receivedBy(email);
    expect(mail!.to).toMatchObject({
      value: [{ address: email, name: 'Eve" <eve@elsewhere.example>, Bcc: all' }],
    });
    expect(mail!.bcc).toBeUndefined();
  });
});

describe("a mail server that does not take it", () => {
  test("is tried again after a while, not at once, and gets the mail with the same Message-ID", async () => {
    const email = await signUp();
    server.refuse = { code: 451, message: "Try again later" };
    expect(await sendDueMail(run())).toBe(0);
    const { messageId } = await rowFor(email);
    server.refuse = null;
    expect(await sendDueMail(later(20_000))).toBe(0);
    expect(await sendDueMail(later(HOUR_MS))).toBe(1);
    expect(receivedBy(email).map((mail) => mail.messageId)).toEqual([messageId]);
    expect(await rowFor(email)).toMatchObject({ attempts: 2, lastError: null });
  });

  test("is waited for longer each time, but never longer than six hours", async () => {
    const email = await signUp();
    server.refuse = { code: 451, message: "Try again later" };
    const waits: number[] = [];
    let at = Date.now();
    for (let attempt = 1; attempt <= 12; attempt += 1) {
      await sendDueMail(run({ now: () => new Date(at) }));
      const { nextAttemptAt } = await rowFor(email);
      waits.push(nextAttemptAt.getTime() - at);
      at = nextAttemptAt.getTime();
    }
    const doubled = Array.from({ length: 10 }, (_, attempt) => 30_000 * 2 ** attempt);
    expect(waits).toEqual([...doubled, 6 * HOUR_MS, 6 * HOUR_MS]);
  });

  test("that knows no such person is not asked again", async () => {
    const email = await signUp();
    server.refuse = { code: 550, message: "No such user here" };
    await sendDueMail(run());
    server.refuse = null;
    expect(await sendDueMail(later(100 * HOUR_MS))).toBe(0);
    const row = await rowFor(email);
    expect(row.givenUpAt).not.toBeNull();
    expect(row.lastError).toContain("No such user here");
  });

  test("does not hold up the mail of others", async () => {
    const [first, second] = [await signUp(), await signUp()];
    const transport: MailRun["transport"] = {
      sendMail: (mail: { to: { address: string } }) =>
        mail.to.address === first ? Promise.reject(new Error("stuck")) : server.transport.sendMail(mail),
    } as MailRun["transport"];
    expect(await sendDueMail(run({ transport }))).toBe(1);
    expect(receivedBy(second)).toHaveLength(1);
  });
});

test("a worker that dies between sending and noting it has the mail sent again under the same Message-ID", async () => {
  const email = await signUp();
  const dying = new Error("killed");
  const transport = {
    sendMail: async (mail: object) => {
      await server.transport.sendMail(mail);
      throw dying;
    },
  } as MailRun["transport"];
  // Dead means that nothing is noted afterwards, not even the failure.
  const deadDb = new Proxy(api().connection.db, {
    get: (db, key) => {
      if (key === "update" && receivedBy(email).length > 0) throw dying;
      return Reflect.get(db, key);
    },
  });
  await expect(sendDueMail(run({ transport, db: deadDb }))).rejects.toBe(dying);
  expect(await sendDueMail(later(60_000))).toBe(0);
  expect(await sendDueMail(later(HOUR_MS))).toBe(1);
  const ids = receivedBy(email).map(({ messageId }) => messageId);
  expect(ids).toHaveLength(2);
  expect(new Set(ids).size).toBe(1);
});
