// The exported web client: its files, and its one page for every address that is not a file.

import { join, resolve } from "node:path";
import express, { Router } from "express";
import { ServiceError } from "./problems.ts";

/** Their names bear a hash of their content. */
const HASHED_FOLDERS = ["/_expo/static", "/assets"];

export function webClient(webDir: string): Router {
  const root = resolve(webDir);
  const router = Router();
  for (const folder of HASHED_FOLDERS) {
    router.use(
      folder,
      express.static(join(root, folder), { index: false, redirect: false, immutable: true, maxAge: "1y" }),
      // Not the page: a browser with an old page would take HTML for the script it asked for.
      () => {
        throw new ServiceError("not_found");
      },
    );
  }
  router.use(
    express.static(root, { index: false, redirect: false, extensions: ["html"], cacheControl: false }),
  );
  router.get("/{*path}", (_request, response) => {
    response.set("Cache-Control", "no-cache");
    response.sendFile(join(root, "index.html"));
  });
  return router;
}
