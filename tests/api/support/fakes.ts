// A real S3 API and a real SMTP server on loopback, each on a port and a folder of its own.

import { mkdtempSync, rmSync } from "node:fs";
import type { AddressInfo } from "node:net";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { createStorage, type Storage } from "@linkwright/server/files";
import { type ParsedMail, simpleParser } from "mailparser";
import { createTransport, type Transporter } from "nodemailer";
import S3rver from "s3rver";
import { SMTPServer } from "smtp-server";

export interface ObjectStore {
  readonly storage: Storage;
  readonly stop: () => Promise<void>;
}

const BUCKET = "sheets";

export async function startObjectStore(): Promise<ObjectStore> {
  const directory = mkdtempSync(join(tmpdir(), "linkwright-s3-"));
  const server = new S3rver({
    address: "127.0.0.1",
    port: 0,
    silent: true,
    directory,
    vhostBuckets: false,
    configureBuckets: [{ name: BUCKET, configs: [] }],
  });
  const { port } = await server.run();
  const storage = createStorage({
    S3_ENDPOINT: `http://127.0.0.1:${port}`,
    S3_REGION: "us-east-1",
    S3_BUCKET: BUCKET,
    S3_ACCESS_KEY_ID: "S3RVER", // the only pair that it knows
    S3_SECRET_ACCESS_KEY: "S3RVER",
  });
  return {
    storage,
    async stop() {
      storage.close();
      await server.close();
      rmSync(directory, { recursive: true, force: true });
    },
  };
}

export interface MailServer {
  readonly transport: Transporter;
  readonly received: readonly ParsedMail[];
  /** What it says to the next recipients instead of taking the mail; null takes it. */
  refuse: { code: number; message: string } | null;
  readonly stop: () => Promise<void>;
}

export async function startMailServer(): Promise<MailServer> {
  const received: ParsedMail[] = [];
  const house: Pick<MailServer, "refuse"> = { refuse: null };
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ["STARTTLS"],
    disableReverseLookup: true,
    onRcptTo(_address, _session, done) {
      const { refuse } = house;
      done(refuse ? Object.assign(new Error(refuse.message), { responseCode: refuse.code }) : null);
    },
    onData(stream, _session, done) {
      simpleParser(stream).then(
        (mail) => {
          received.push(mail);
          done();
        },
        (error: Error) => done(error),
      );
    },
  });
  await new Promise<void>((resolve) => server.listen(0, "127.0.0.1", resolve));
  const { port } = server.server.address() as AddressInfo;
  const transport = createTransport(`smtp://127.0.0.1:${port}`);
  return Object.assign(house, {
    transport,
    received,
    async stop() {
      transport.close();
      await new Promise<void>((resolve) => server.close(resolve));
    },
  });
}
