// Who acts in a test, and the study each test has to itself.

import { randomUUID } from "node:crypto";
import { RevisionAnswer } from "@linkwright/contract";
import { test as base, expect, type Page } from "@playwright/test";

export { expect };

/** The demo's password: it protects nothing but invented data. */
const PASSWORD = "layout dye and scriber";

/** Any value proves that the request was made on purpose; see the contract's CSRF_HEADER. */
const HEADERS = { "X-Linkwright-Request": "e2e" };

export type Role = "owner" | "engineer" | "fabricator" | "reviewer";

export interface StudyPlace {
  readonly workshopId: string;
  readonly buildId: string;
  readonly studyId: string;
}

interface Fixtures {
  /** Signs the page's browser in as the demo's person of that role. */
  readonly signInAs: (role: Role) => Promise<void>;
  /** A copy of a demo study of that name, made by the engineer for this test alone. */
  readonly copyStudy: (name: string) => Promise<StudyPlace>;
  /** Saves the study's draft as its next revision, as the engineer; answers what was saved. */
  readonly saveRevision: (place: StudyPlace) => Promise<RevisionAnswer>;
  readonly openStudy: (place: StudyPlace, tab: string) => Promise<void>;
}

async function signIn(page: Page, role: Role): Promise<string> {
  const data = { email: `${role}@example.org`, password: PASSWORD };
  const answer = await page.request.post("/api/auth/sign-in", { headers: HEADERS, data });
  expect(answer.status(), await answer.text()).toBe(200);
  return (await answer.json()).memberships[0].workshopId;
}

async function locate(page: Page, workshopId: string, name: string): Promise<StudyPlace> {
  const { builds } = await (await page.request.get(`/api/workshops/${workshopId}/builds`)).json();
  for (const build of builds) {
    const answer = await page.request.get(`/api/workshops/${workshopId}/builds/${build.id}/studies`);
    const { studies } = await answer.json();
    const study = studies.find((each: { name: string }) => each.name === name);
    if (study) return { workshopId, buildId: build.id, studyId: study.id };
  }
  throw new Error(`The demo has no study called "${name}".`);
}

export const test = base.extend<Fixtures>({
  signInAs: async ({ page }, use) => {
    await use(async (role) => {
      await signIn(page, role);
    });
  },
  saveRevision: async ({ page }, use) => {
    await use(async ({ workshopId, studyId }) => {
      await signIn(page, "engineer");
      const study = `/api/workshops/${workshopId}/studies/${studyId}`;
      const { version } = await (await page.request.get(study)).json();
      const data = { id: randomUUID(), version, note: "For the jig" };
      const answer = await page.request.post(`${study}/revisions`, { headers: HEADERS, data });
      expect(answer.status(), await answer.text()).toBe(201);
      return RevisionAnswer.parse(await answer.json());
    });
  },
  copyStudy: async ({ page }, use) => {
    await use(async (name) => {
      const workshopId = await signIn(page, "engineer");
      const { buildId, studyId } = await locate(page, workshopId, name);
      const id = randomUUID();
      const answer = await page.request.post(`/api/workshops/${workshopId}/builds/${buildId}/studies`, {
        headers: HEADERS,
        data: { id, name: `${name}, copy ${id.slice(0, 8)}`, source: { type: "copy", studyId } },
      });
      expect(answer.status(), await answer.text()).toBe(201);
      return { workshopId, buildId, studyId: id };
    });
  },
  openStudy: async ({ page }, use) => {
    await use(async ({ buildId, studyId }, tab) => {
      await page.goto(`/builds/${buildId}/studies/${studyId}/${tab}`);
    });
  },
});
