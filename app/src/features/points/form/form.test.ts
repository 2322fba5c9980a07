import { AxleSchema, StudySchema } from "@linkwright/contract";
import { expect, test } from "vitest";
import { labelledValue, shownFrom, valueFrom } from "./fieldKinds.ts";
import { type FormField, formSchema, formValues } from "./formSchema.ts";

const BODY: readonly FormField[] = [
  { name: "massKg", label: "Mass", kind: "mass" },
  { name: "frontMassShare", label: "Front", kind: "share" },
  { name: "cgHeight", label: "Height", kind: "length" },
];
const body = (given: object, units: "mm" | "inch" = "mm") =>
  formSchema({
    fields: BODY,
    given: given as never,
    units,
    empty: undefined,
    part: AxleSchema.shape.body.unwrap(),
  });

test.each(["length", "angle", "gradient", "share", "plain"] as const)("%s comes back as it was", (kind) => {
  for (const units of ["mm", "inch"] as const) {
    expect(valueFrom(shownFrom(12.7, kind, units), kind, units)).toBeCloseTo(12.7, 12);
  }
});

test("an empty field is left out, and a comma is a decimal mark", () => {
  expect(body({}).parse({ massKg: "640", frontMassShare: "46,5", cgHeight: "" })).toEqual({
    massKg: 640,
    frontMassShare: 0.465,
  });
});

test("a field left as it was keeps every digit that it does not show", () => {
  const given = { cgHeight: 410.123456 };
  const values = formValues(BODY, given, "inch");
  expect(values.cgHeight).toBe("16.147");
  expect(body(given, "inch").parse(values)).toEqual(given);
});

test("rubbish and what the contract refuses are told at their own field", () => {
  const told = body({}).safeParse({ massKg: "much", frontMassShare: "140", cgHeight: "" });
  expect(told.success).toBe(false);
  expect(told.error?.issues[0]).toMatchObject({ path: ["massKg"] });
  const refused = body({}).safeParse({ massKg: "640", frontMassShare: "140", cgHeight: "" });
  expect(refused.error?.issues[0]).toMatchObject({ path: ["frontMassShare"] });
});

test("fields are gathered into the shape that the document has", () => {
  const fields: readonly FormField[] = [
    { name: "name", label: "Name", kind: "text" },
    { name: "wheelUp", label: "Wheel up", kind: "length" },
    { name: "droop", label: "Droop", kind: "length" },
    { name: "bump", label: "Bump", kind: "length" },
  ];
  const schema = formSchema({
    fields,
    given: {},
    units: "mm",
    empty: undefined,
    shape: ({ droop, bump, ...rest }) => ({ rakeDeg: 0, ...rest, band: [droop, bump] }),
    part: StudySchema.shape.rideHeights.element,
  });
  expect(schema.parse({ name: "Low", wheelUp: "30", droop: "-40", bump: "40" })).toEqual({
    name: "Low",
    wheelUp: 30,
    rakeDeg: 0,
    band: [-40, 40],
  });
});

test("what is not given is said in words", () => {
  expect(labelledValue(undefined, "mass", "mm")).toBe("not given");
  expect(labelledValue(0.64, "share", "mm")).toBe("64.0\u00a0%");
  expect(labelledValue(-0.75, "angle", "mm")).toBe("−0.75°");
});
