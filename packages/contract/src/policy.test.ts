import { describe, expect, test } from "vitest";
import { ACTIONS, type Action, may, maySettleComment } from "./policy.ts";
import { Role } from "./primitives.ts";

/** Who may, read out of the roles' descriptions by hand. */
const WHO_MAY: Readonly<Record<Action, readonly Role[]>> = {
  "workshop.read": ["owner", "engineer", "fabricator", "reviewer"],
  "build.edit": ["owner", "engineer"],
  "study.edit": ["owner", "engineer"],
  "revision.save": ["owner", "engineer"],
  "comment.write": ["owner", "engineer", "fabricator", "reviewer"],
  "comment.settleAny": ["owner", "engineer"],
  "sheet.make": ["owner", "engineer", "fabricator"],
};

describe.each(ACTIONS)("%s", (action) => {
  test.each(Role.options)("%s", (role) => {
    expect(may(role, action)).toBe(WHO_MAY[action].includes(role));
  });
});

test("an owner may all that any other role may", () => {
  for (const action of ACTIONS) {
    const anyone = Role.options.some((role) => may(role, action));
    expect(may("owner", action)).toBe(anyone);
  }
});

test("one's own comment may be settled by every role, another's by engineer and owner", () => {
  expect(Role.options.map((role) => maySettleComment(role, true))).toEqual([true, true, true, true]);
  expect(Role.options.filter((role) => maySettleComment(role, false))).toEqual(["owner", "engineer"]);
});
