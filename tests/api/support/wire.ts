// A wire to the database that can be cut: from the server's side the database is then away.

import type { AddressInfo } from "node:net";
import { connect, createServer, type Socket } from "node:net";

export interface Wire {
  /** The database's address through this wire. */
  readonly url: string;
  readonly cut: () => void;
  readonly mend: () => void;
  readonly stop: () => Promise<void>;
}

export async function layWire(databaseUrl: string): Promise<Wire> {
  const target = new URL(databaseUrl);
  const open = new Set<Socket>();
  let isCut = false;
  const server = createServer((near) => {
    if (isCut) {
      near.destroy();
      return;
    }
    const far = connect(Number(target.port), target.hostname);
    for (const socket of [near, far]) {
      open.add(socket);
      socket.on("error", () => {});
      socket.on("close", () => {
        open.delete(socket);
        near.destroy();
        far.destroy();
      });
    }
    near.pipe(far).pipe(near);
  });
  await new Promise<void>((resolve) => server.listen(0, "127.0.0.1", resolve));
  const url = new URL(databaseUrl);
  url.host = `127.0.0.1:${(server.address() as AddressInfo).port}`;
  const cut = () => {
    isCut = true;
    for (const socket of open) socket.destroy();
  };
  return {
    url: url.href,
    cut,
    mend: () => {
      isCut = false;
    },
    async stop() {
      cut();
      await new Promise((resolve) => server.close(resolve));
    },
  };
}
