import type { Edit } from "@linkwright/contract";
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { mergeEdits, rewind } from "./mergeEdits.ts";
import type { SaveRow } from "./repo.ts";

const someone = { id: "a", name: "Someone" };
const savedBy = (version: number, ...edits: Edit[]): SaveRow => ({
  version,
  edits,
  createdBy: someone,
  createdAt: new Date(0),
});

/** A flat document of points. */
const NAMES = ["p", "q", "r", "s"];
const start = Object.fromEntries(NAMES.map((name) => [name, [0, 0, 0]]));
const anyEdits = (from: Record<string, number[]>) =>
  fc.array(
    fc
      .tuple(fc.constantFrom(...NAMES), fc.tuple(fc.integer(), fc.integer(), fc.integer()))
      .map(([name, to]) => ({
        path: [name],
        from: from[name]!,
        to: to as number[],
      })),
    { minLength: 1, maxLength: 4 },
  );
/** One edit a place: chains within a save are another test's matter. */
const distinct = (edits: readonly Edit[]) => [...new Map(edits.map((edit) => [edit.path[0], edit])).values()];

const RUNS = { seed: 20_261_201, numRuns: 300 };

describe("two saves made on the same version", () => {
  test("never lose a value: the second gets in, or is told of exactly the places where the two disagree", () => {
    fc.assert(
      fc.property(anyEdits(start), anyEdits(start), (first, second) => {
        const mine = distinct(second);
        const merged = mergeEdits(start, distinct(first), []);
        if (merged.status !== "merged") throw new Error("the first save has nobody to disagree with");
        const then = mergeEdits(merged.draft, mine, [savedBy(2, ...merged.done)]);
        const theirs = merged.draft as Record<string, number[]>;
        const disputed = mine.filter(({ path, from, to }) => {
          const stands = JSON.stringify(theirs[path[0]!]);
          return stands !== JSON.stringify(from) && stands !== JSON.stringify(to);
        });
        if (disputed.length === 0) {
          expect(then.status).toBe("merged");
          const draft = (then as { draft: Record<string, number[]> }).draft;
          for (const { path, to } of mine) expect(draft[path[0]!]).toEqual(to);
          return;
        }
        expect(then).toMatchObject({
          status: "conflict",
          conflicts: disputed.map(({ path, to }) => ({
            path,
            theirs: theirs[path[0]!],
            yours: to,
            changedBy: someone,
          })),
        });
      }),
      RUNS,
    );
  });
});

test("rewinding the saves of a draft, newest first, gives back what it was before them", () => {
  fc.assert(
    fc.property(fc.array(anyEdits(start), { minLength: 1, maxLength: 5 }), (all) => {
      let draft: unknown = start;
      const saves = all.map((edits, at) => {
        const onNewest = distinct(edits).map((edit) => ({
          ...edit,
          from: (draft as Record<string, number[]>)[edit.path[0]!]!,
        }));
        const merge = mergeEdits(draft, onNewest, []);
        if (merge.status !== "merged") throw new Error("an edit of what stands there is never refused");
        draft = merge.draft;
        return savedBy(at + 2, ...merge.done);
      });
      expect(rewind(draft, saves)).toEqual(start);
    }),
    RUNS,
  );
});
