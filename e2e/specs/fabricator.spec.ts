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
  const revision = await saveRevision(study);
  await signInAs("fabricator");
  await openStudy(study, "sheets");
  await page.getByRole("button", { name: "Make the table" }).click();
  const link = page.getByRole("link", { name: /^Download/ });
  await expect(link).toBeVisible();
  const started = page.waitForEvent("download");
  await link.click();
  const text = await readFile(await (await started).path(), "utf8");
  const lines = text.split("\r\n");
  expect(lines.some((line) => line.startsWith("NOT RELEASED"))).toBe(true);
  expect(lines).toContain(`Revision,${revision.number}`);
  const hash = lines.find((line) => line.startsWith("Hash,"))?.slice("Hash,".length) ?? "";
  expect(hash.length).toBeGreaterThanOrEqual(8);
  expect(revision.hash.startsWith(hash)).toBe(true);
  expect(lines).toContain("Units,mm");
  // Worked by hand: in the car the joint is at (8, 566, 152). The jig's origin is (210, 0, 120), its x points
  // rearward and its z up, so its y = z × x points to the right: (210 − 8, −566, 152 − 120).
  expect(revision.study.axle.left.suspension.lowerArm.ballJoint).toEqual([8, 566, 152]);
  const row = lines.find((line) => line.startsWith("left,Lower arm,ball joint,"));
  expect(row?.split(",").slice(3).map(Number)).toEqual([202, -566, 32]);
});
