// The small values that many requests and answers share.

import { z } from "zod";

/** Made by the client, so that a request that is repeated creates nothing twice. */
export const Id = z.uuid("This is not an id of the usual form (a UUID)");
export type Id = z.infer<typeof Id>;

/** ISO 8601 in UTC. */
export const Timestamp = z.iso.datetime();

/** One line of text: names and titles. No control characters, so that it is safe in a mail's head or a CSV. */
export function lineOf(maxLength: number) {
  return z
    .string()
    .trim()
    .min(1, "This is empty")
    .max(maxLength, `This is longer than ${maxLength} characters`)
    .regex(/^\P{Cc}*$/u, "Line breaks and control characters do not fit here");
}

/** Text of several lines. */
export function textOf(maxLength: number) {
  return z.string().trim().max(maxLength, `This is longer than ${maxLength} characters`);
}

export const Name = lineOf(120);

/** Who did something. */
export const PersonRef = z.object({ id: Id, name: z.string() });
export type PersonRef = z.infer<typeof PersonRef>;

export const Role = z.enum(["owner", "engineer", "fabricator", "reviewer"]);
export type Role = z.infer<typeof Role>;

export const LengthUnit = z.enum(["mm", "inch"]);
export type LengthUnit = z.infer<typeof LengthUnit>;
