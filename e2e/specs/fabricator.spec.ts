// The fabricator's part of the main job: the hardpoint table of a saved revision, as a file.

import { readFile } from "node:fs/promises";
import { expect, test } from "../fixtures.ts";

test("a fabricator makes and downloads the hardpoint table of a saved revision", async ({
  page,
  copyStudy,
  saveRevision,
  signInAs,
  openStudy,
}) => {
  const study = await copyStudy("Front axle, rack lowered");
  await saveRevision(study);
  await signInAs("fabricator");
  await openStudy(study, "sheets");
  await page.getByRole("button", { name: "Make the table" }).click();
  const link = page.getByRole("link", { name: /^Download/ });
  await expect(link).toBeVisible();
  const started = page.waitForEvent("download");
  await link.click();
  const text = await readFile(await (await started).path(), "utf8");
  expect(text).toContain("NOT RELEASED");
  expect(text).toMatch(/[0-9a-f]{12}/);
  expect(text).toMatch(/ball joint/i);
});
