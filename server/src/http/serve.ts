// A route of the contract and what answers it: signed in → parse → authorise → act → present, always in this order.

import type { Readable } from "node:stream";
import { pipeline } from "node:stream/promises";
import { type Action, API_ROUTES, may, type Role, type Route } from "@linkwright/contract";
import { type Db, inWorkshop, type WorkshopScope } from "@linkwright/db";
import type { Request, Response, Router } from "express";
import type { z } from "zod";
import { parseBody, parseParams } from "./parse.ts";
import { ServiceError } from "./problems.ts";

export interface Call<Params, Body> {
  readonly params: Params;
  readonly body: Body;
  readonly request: Request;
  readonly response: Response;
}

export interface SignedInCall<Params, Body> extends Call<Params, Body> {
  readonly personId: string;
}

/** Everything happens in one transaction inside the workshop that the path names. */
export interface TenantCall<Params, Body> extends SignedInCall<Params, Body> {
  readonly scope: WorkshopScope;
  readonly role: Role;
}

/** A file to be sent; it is opened after the transaction, so that a slow reader holds no connection. */
export interface FileAnswer {
  readonly fileName: string;
  readonly contentType: string;
  readonly byteSize: number;
  readonly open: () => Promise<Readable>;
}

type Answer<A extends z.ZodType> = Promise<z.input<A>>;
type TenantRoute<
  P extends z.ZodType<{ workshopId: string }>,
  B extends z.ZodType,
  A extends z.ZodType,
> = Route<P, B, A>;

export interface ServeOptions {
  readonly db: Db;
  readonly findRole: (scope: WorkshopScope, personId: string) => Promise<Role | null>;
}

export type Serve = ReturnType<typeof createServe>;

export function createServe({ db, findRole }: ServeOptions) {
  const served = new Set<Route>();

  function register(
    router: Router,
    route: Route,
    handle: (request: Request, response: Response) => Promise<void>,
  ) {
    if (served.has(route)) throw new Error(`${route.method} ${route.path} is served twice`);
    served.add(route);
    const method = route.method.toLowerCase() as "get" | "post" | "patch"; // Route.method has no other values
    router[method](route.path, handle);
  }

  function inTenant<P extends z.ZodType<{ workshopId: string }>, B extends z.ZodType, T>(
    route: TenantRoute<P, B, z.ZodType>,
    handler: (call: TenantCall<z.output<P>, z.output<B>>) => Promise<T>,
  ) {
    const action = tenantAction(route);
    return async (request: Request, response: Response): Promise<T> => {
      const personId = requirePerson(request);
      const params = parseParams(route.params, request.params);
      const body = parseBody(route.body, request.body);
      return inWorkshop(db, params.workshopId, async (scope) => {
        const role = await findRole(scope, personId);
        if (role === null) throw new ServiceError("not_found");
        if (!may(role, action)) throw new ServiceError("not_allowed");
        return handler({ params, body, personId, role, scope, request, response });
      });
    };
  }

  return {
    /** Whoever asks. */
    open<P extends z.ZodType, B extends z.ZodType, A extends z.ZodType>(
      router: Router,
      route: Route<P, B, A>,
      handler: (call: Call<z.output<P>, z.output<B>>) => Answer<A>,
    ): void {
      register(router, route, async (request, response) => {
        const params = parseParams(route.params, request.params);
        const body = parseBody(route.body, request.body);
        send(response, route, await handler({ params, body, request, response }));
      });
    },

    /** Whoever is signed in. */
    signedIn<P extends z.ZodType, B extends z.ZodType, A extends z.ZodType>(
      router: Router,
      route: Route<P, B, A>,
      handler: (call: SignedInCall<z.output<P>, z.output<B>>) => Answer<A>,
    ): void {
      register(router, route, async (request, response) => {
        const personId = requirePerson(request);
        const params = parseParams(route.params, request.params);
        const body = parseBody(route.body, request.body);
        send(response, route, await handler({ params, body, personId, request, response }));
      });
    },

    /** Members of the workshop in the path whose role has the right that the route names. */
    tenant<P extends z.ZodType<{ workshopId: string }>, B extends z.ZodType, A extends z.ZodType>(
      router: Router,
      route: TenantRoute<P, B, A>,
      handler: (call: TenantCall<z.output<P>, z.output<B>>) => Answer<A>,
    ): void {
      const act = inTenant(route, handler);
      register(router, route, async (request, response) => {
        send(response, route, await act(request, response));
      });
    },

    /** The same, answered with a file. */
    tenantFile<P extends z.ZodType<{ workshopId: string }>, B extends z.ZodType>(
      router: Router,
      route: TenantRoute<P, B, z.ZodType>,
      handler: (call: TenantCall<z.output<P>, z.output<B>>) => Promise<FileAnswer>,
    ): void {
      const act = inTenant(route, handler);
      register(router, route, async (request, response) => {
        await sendFile(response, await act(request, response));
      });
    },

    /** Call it when all routers are built: a route that the contract promises and nobody serves is a bug. */
    requireAllServed(): void {
      const missing = API_ROUTES.filter((route) => !served.has(route));
      const names = missing.map((route) => `${route.method} ${route.path}`);
      if (names.length > 0) throw new Error(`Nobody serves ${names.join(", ")}`);
    },
  };
}

function tenantAction(route: Route): Action {
  if (route.access === "public" || route.access === "signedIn") {
    throw new Error(`${route.method} ${route.path} names no right that a member needs`);
  }
  return route.access;
}

function requirePerson(request: Request): string {
  if (!request.user) throw new ServiceError("not_signed_in");
  return request.user.id;
}

/** Parsed once more on its way out: what the contract does not name never leaves the house. */
function send(response: Response, route: Route, answer: unknown): void {
  response.status(route.status);
  if (route.status === 204) response.end();
  else response.json(route.answer.parse(answer));
}

async function sendFile(response: Response, file: FileAnswer): Promise<void> {
  const bytes = await file.open();
  response.attachment(file.fileName);
  response.set({
    "Content-Type": file.contentType,
    "Content-Length": String(file.byteSize),
    "X-Content-Type-Options": "nosniff",
  });
  await pipeline(bytes, response);
}
