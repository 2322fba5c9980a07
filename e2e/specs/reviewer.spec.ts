// The reviewer's part of the main job: a comment pinned to a hardpoint, and nothing that edits.

import { expect, test } from "../fixtures.ts";

test("a reviewer pins a comment to a hardpoint and may not move it", async ({
  page,
  copyStudy,
  signInAs,
  openStudy,
}) => {
  const study = await copyStudy("Front axle, as first drawn");
  await signInAs("reviewer");
  await openStudy(study, "review");
  const write = page.getByRole("button", { name: "Write a comment" });
  const comment = page.getByLabel("Comment", { exact: true });
  await expect(write.or(comment).first()).toBeVisible();
  if (await write.isVisible()) await write.click();
  await page.getByLabel("About").selectOption({ label: "Lower arm, ball joint, left" });
  await comment.fill("Is the taper of this joint the one on the drawing?");
  await page.getByRole("button", { name: "Add the comment" }).click();
  const listed = page.getByRole("listitem").filter({ hasText: "Is the taper of this joint" });
  await expect(listed).toContainText("Lower arm, ball joint, left");
  await expect(page.getByRole("button", { name: "Save revision" })).toHaveCount(0);
  await openStudy(study, "points");
  await expect(page.getByText("You read this study")).toBeVisible();
  await expect(page.getByText("you are here as a reviewer")).toBeVisible();
});
