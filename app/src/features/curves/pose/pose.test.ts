import { expect, test } from "vitest";
import { type Pose, paramsOfPose, REST_POSE, withParams } from "./pose.ts";
import { createPoseStore } from "./poseStore.ts";

const pose: Pose = { height: "Hill climb", isEveryHeight: true, travel: -32.5, steer: 12, side: "right" };

test("a pose comes back out of its address as it was", () => {
  expect(withParams(REST_POSE, paramsOfPose(pose))).toEqual(pose);
});

test("at rest nothing stands in the address", () => {
  expect(Object.values(paramsOfPose(REST_POSE))).toEqual([
    undefined,
    undefined,
    undefined,
    undefined,
    undefined,
  ]);
});

test("what an address does not name, or names wrongly, stays as it is", () => {
  expect(withParams(pose, { travel: "up", side: "middle", steer: "" })).toEqual(pose);
  expect(withParams(pose, { travel: "10" })).toEqual({ ...pose, travel: 10 });
});

test("travel is written to a hundredth of a millimetre", () => {
  expect(paramsOfPose({ ...REST_POSE, travel: 12.3456 }).travel).toBe("12.35");
});

test("a store tells its readers of a change, and of nothing else", () => {
  const store = createPoseStore(REST_POSE, (act) => act());
  let told = 0;
  const stop = store.subscribe(() => {
    told += 1;
  });
  store.change({ travel: 5 });
  store.change({ travel: 5 });
  expect(told).toBe(1);
  stop();
  store.change({ travel: 6 });
  expect(told).toBe(1);
  expect(store.get().travel).toBe(6);
});

test("a pointer that tells many moves within a frame is heard once, with the last of them", () => {
  const frames: (() => void)[] = [];
  const store = createPoseStore(REST_POSE, (act) => frames.push(act));
  const heard: number[] = [];
  store.subscribe(() => heard.push(store.get().travel));
  store.follow({ travel: 1 });
  store.follow({ travel: 2 });
  store.follow({ travel: 3 });
  expect(heard).toEqual([]);
  for (const act of frames.splice(0)) act();
  expect(heard).toEqual([3]);
});

test("a change made at once is not undone by a move that was still awaited", () => {
  const frames: (() => void)[] = [];
  const store = createPoseStore(REST_POSE, (act) => frames.push(act));
  store.follow({ travel: 3, steer: 4 });
  store.change({ travel: 10 });
  for (const act of frames.splice(0)) act();
  expect(store.get()).toMatchObject({ travel: 10, steer: 4 });
});
