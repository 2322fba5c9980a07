// Kinematics owns the documents' types, this package their schemas. Where the two differ, this file does not compile.

import type { Axle, Issue, Study } from "@linkwright/kinematics";
import type { z } from "zod";
import type { AxleSchema } from "./axle.ts";
import type { ProblemIssue } from "./problems.ts";
import type { StudySchema } from "./study.ts";

/** The documents are readonly; what zod infers is not. */
type DeepReadonly<T> = T extends object ? { readonly [K in keyof T]: DeepReadonly<T[K]> } : T;

type Agree<A, B> = [A] extends [B] ? ([B] extends [A] ? true : "the second has more") : "the first has more";

true satisfies Agree<DeepReadonly<z.output<typeof AxleSchema>>, Axle>;
true satisfies Agree<DeepReadonly<z.input<typeof AxleSchema>>, Axle>;
true satisfies Agree<DeepReadonly<z.output<typeof StudySchema>>, Study>;
true satisfies Agree<DeepReadonly<z.input<typeof StudySchema>>, Study>;

/** On the wire an issue may come without its value, so only one direction holds. */
undefined as unknown as Issue satisfies ProblemIssue;
