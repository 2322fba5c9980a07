// The engineer's part of the main job: move the rack until bump steer is flat at both ride heights, save a revision.

import type { Page } from "@playwright/test";
import { expect, test } from "../fixtures.ts";

/** The peak to peak that stands at a ride height now: what was before is struck through ahead of it. */
async function peakToPeakDeg(page: Page, height: string): Promise<number> {
  const text = (await page.getByRole("group", { name: `Bump steer at ${height}` }).textContent()) ?? "";
  const part = text.slice(text.indexOf("Peak to peak"), text.indexOf("Worst in band"));
  return Number(part.match(/\d+\.\d+/g)?.at(-1));
}

test("an engineer flattens bump steer at two ride heights, applies it and saves a revision", async ({
  page,
  copyStudy,
  openStudy,
}) => {
  const study = await copyStudy("Front axle, as first drawn");
  await openStudy(study, "flatten");
  await expect(page.getByRole("group", { name: "Bump steer at Road" })).toBeVisible();
  const before = {
    road: await peakToPeakDeg(page, "Road"),
    hillClimb: await peakToPeakDeg(page, "Hill climb"),
  };
  await page.getByRole("button", { name: "Find the flattest" }).click();
  await expect.poll(() => peakToPeakDeg(page, "Road")).toBeLessThan(before.road / 4);
  await expect.poll(() => peakToPeakDeg(page, "Hill climb")).toBeLessThan(before.hillClimb / 4);
  await page.getByRole("button", { name: "Apply" }).click();
  await page.getByRole("button", { name: "Save revision" }).first().click();
  const dialog = page.getByRole("dialog");
  await dialog.getByLabel("Note").fill("Rack moved until both ride heights are flat.");
  await dialog.getByRole("button", { name: "Save revision" }).click();
  await expect(dialog.getByRole("button", { name: "Go on" })).toBeVisible();
  await dialog.getByRole("button", { name: "Go on" }).click();
  await expect(page.getByText(/Draft after rev 1/).first()).toBeVisible();
});
