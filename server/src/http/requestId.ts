// Every request has an id that stands in the answer's head, in a problem's body and in the log.

import { randomUUID } from "node:crypto";
import type { RequestHandler, Response } from "express";

const HEADER = "X-Request-Id";

export const nameRequest: RequestHandler = (_request, response, next) => {
  response.set(HEADER, randomUUID());
  next();
};

export function requestId(response: Response): string {
  return response.get(HEADER) ?? "";
}
