// Accounts: signing up, in and out, and what a person prefers.

import { z } from "zod";
import { Id, LengthUnit, lineOf, Name, Role } from "./primitives.ts";
import { defineRoute, NoAnswer, NoBody, NoParams } from "./route.ts";

const EMAIL_LENGTH = 254;
const PASSWORD_MIN_LENGTH = 10;
/** argon2id costs no more for a longer one, but what is parsed has to end somewhere. */
const PASSWORD_MAX_LENGTH = 200;

/** Compared without regard to case, so it is kept in small letters. */
export const Email = z
  .string()
  .trim()
  .toLowerCase()
  .max(EMAIL_LENGTH, `This is longer than ${EMAIL_LENGTH} characters`)
  .pipe(z.email("This is not an e-mail address"));

export const NewPassword = z
  .string()
  .min(PASSWORD_MIN_LENGTH, `A password has at least ${PASSWORD_MIN_LENGTH} characters`)
  .max(PASSWORD_MAX_LENGTH, `A password has at most ${PASSWORD_MAX_LENGTH} characters`);

export const SignUpRequest = z.strictObject({
  personId: Id,
  workshopId: Id,
  name: Name,
  workshopName: Name,
  email: Email,
  password: NewPassword,
  cautionsAcknowledged: z.literal(true, "The cautions have to be acknowledged"),
});
export type SignUpRequest = z.infer<typeof SignUpRequest>;

/** The same whether or not the address had an account: signing up must not tell who is a customer. */
export const SignUpAnswer = z.object({ email: z.string() });
export type SignUpAnswer = z.infer<typeof SignUpAnswer>;

export const SignInRequest = z.strictObject({
  email: z.string().trim().toLowerCase().min(1, "Give your e-mail address").max(EMAIL_LENGTH),
  password: z.string().min(1, "Give your password").max(PASSWORD_MAX_LENGTH),
});
export type SignInRequest = z.infer<typeof SignInRequest>;

export const Preferences = z.object({
  units: LengthUnit,
  dialect: z.enum(["uk", "us"]),
  theme: z.enum(["light", "dark", "system"]),
});
export type Preferences = z.infer<typeof Preferences>;

export const ChangeMeRequest = z.strictObject({
  name: z.exactOptional(lineOf(120)),
  units: z.exactOptional(Preferences.shape.units),
  dialect: z.exactOptional(Preferences.shape.dialect),
  theme: z.exactOptional(Preferences.shape.theme),
});
export type ChangeMeRequest = z.infer<typeof ChangeMeRequest>;

export const Membership = z.object({ workshopId: Id, workshopName: z.string(), role: Role });
export type Membership = z.infer<typeof Membership>;

export const Me = z.object({
  id: Id,
  name: z.string(),
  email: z.string(),
  preferences: Preferences,
  memberships: z.array(Membership),
});
export type Me = z.infer<typeof Me>;

export const authRoutes = {
  signUp: defineRoute({
    method: "POST",
    path: "/api/auth/sign-up",
    access: "public",
    params: NoParams,
    body: SignUpRequest,
    answer: SignUpAnswer,
    status: 202,
  }),
  signIn: defineRoute({
    method: "POST",
    path: "/api/auth/sign-in",
    access: "public",
    params: NoParams,
    body: SignInRequest,
    answer: Me,
    status: 200,
  }),
  signOut: defineRoute({
    method: "POST",
    path: "/api/auth/sign-out",
    access: "public",
    params: NoParams,
    body: NoBody,
    answer: NoAnswer,
    status: 204,
  }),
  me: defineRoute({
    method: "GET",
    path: "/api/me",
    access: "signedIn",
    params: NoParams,
    body: NoBody,
    answer: Me,
    status: 200,
  }),
  changeMe: defineRoute({
    method: "PATCH",
    path: "/api/me",
    access: "signedIn",
    params: NoParams,
    body: ChangeMeRequest,
    answer: Me,
    status: 200,
  }),
} as const;
