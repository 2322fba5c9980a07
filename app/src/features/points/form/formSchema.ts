// Fields of text → a part of the document, by the contract's own schema for it.

import type { LengthUnit } from "@linkwright/contract";
import { z } from "zod";
import { parseNumber } from "../../../lib/parseNumber.ts";
import { type FieldKind, textFrom, valueFrom } from "./fieldKinds.ts";

export interface FormField {
  readonly name: string;
  readonly label: string;
  readonly help?: string;
  /** Text is taken as it is. */
  readonly kind: FieldKind | "text";
}

export type FormValues = Record<string, string>;
type Given = Readonly<Record<string, unknown>>;

export function formValues(fields: readonly FormField[], given: Given, units: LengthUnit): FormValues {
  return Object.fromEntries(
    fields.map(({ name, kind }) => {
      const value = given[name];
      const text =
        kind === "text" ? String(value ?? "") : textFrom(value as number | null | undefined, kind, units);
      return [name, text];
    }),
  );
}

interface FormRequest<Part> {
  readonly fields: readonly FormField[];
  readonly given: Given;
  readonly units: LengthUnit;
  /** An empty field becomes this: left out, or null where the document says null. */
  readonly empty: null | undefined;
  /** What is read off the fields, turned into the part of the document. */
  readonly shape?: (values: Given) => unknown;
  readonly part: z.ZodType<Part>;
}

/** A field left as it was keeps its value to the last digit, though it shows it rounded. */
export function formSchema<Part>(request: FormRequest<Part>): z.ZodType<Part, FormValues> {
  const { fields, given, units, empty, shape, part } = request;
  const initial = formValues(fields, given, units);
  const entries = fields.map(
    (field) => [field.name, fieldSchema(field, initial, given, units, empty)] as const,
  );
  return z
    .object(Object.fromEntries(entries))
    .transform((values: Given) => {
      const present = Object.fromEntries(Object.entries(values).filter(([, value]) => value !== undefined));
      return shape ? shape(present) : present;
    })
    .pipe(part as z.ZodType<Part, unknown>) as unknown as z.ZodType<Part, FormValues>;
}

function fieldSchema(
  { name, kind }: FormField,
  initial: FormValues,
  given: Given,
  units: LengthUnit,
  empty: null | undefined,
) {
  if (kind === "text") return z.string();
  return z.string().transform((text, context) => {
    if (text === initial[name] && text !== "") return given[name];
    if (text.trim() === "") return empty;
    const parsed = parseNumber(text);
    if (parsed.status === "number") return valueFrom(parsed.value, kind, units);
    context.addIssue({ code: "custom", message: parsed.message });
    return z.NEVER;
  });
}
