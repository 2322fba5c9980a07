import {
  authRoutes,
  type ChangeMeRequest,
  type Me,
  type SignInRequest,
  type SignUpRequest,
} from "@linkwright/contract";
import { type QueryClient, queryOptions, useMutation, useQueryClient } from "@tanstack/react-query";
import { isProblem } from "@/lib/problem.ts";
import { readStored, removeStored, writeStored } from "@/lib/storage.ts";
import { callApi } from "./client.ts";

const ME = ["me"] as const;

const SIGNED_IN_KEY = "linkwright.signedIn";

/** Whether this browser has a session as far as it remembers: a visitor's pages then need not ask. */
export function remembersSession(): boolean {
  return readStored(SIGNED_IN_KEY) !== null;
}

/** Null when nobody is signed in: an answer, not an error. */
export const meQuery = queryOptions({
  queryKey: ME,
  queryFn: async ({ signal }): Promise<Me | null> => {
    try {
      const me = await callApi(authRoutes.me, { params: {}, signal });
      writeStored(SIGNED_IN_KEY, "yes");
      return me;
    } catch (error) {
      if (isProblem(error, "not_signed_in")) {
        removeStored(SIGNED_IN_KEY);
        return null;
      }
      throw error;
    }
  },
});

function forgetAllButMe(client: QueryClient) {
  client.removeQueries({ predicate: ({ queryKey }) => queryKey[0] !== ME[0] });
}

export function useSignUp() {
  return useMutation({
    mutationFn: (body: SignUpRequest) => callApi(authRoutes.signUp, { params: {}, body }),
  });
}

/** `expectedId`: whose pages are open already; what they have loaded stays if it is they who sign in. */
export function useSignIn(expectedId?: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: SignInRequest) => callApi(authRoutes.signIn, { params: {}, body }),
    onSuccess: (me) => {
      // Whatever another person had loaded on this device goes first.
      if (me.id !== expectedId) forgetAllButMe(client);
      writeStored(SIGNED_IN_KEY, "yes");
      client.setQueryData(ME, me);
    },
  });
}

export function useSignOut() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () => callApi(authRoutes.signOut, { params: {} }),
    onSuccess: () => {
      removeStored(SIGNED_IN_KEY);
      client.setQueryData(ME, null);
      forgetAllButMe(client);
    },
  });
}

export function useChangeMe() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: ChangeMeRequest) => callApi(authRoutes.changeMe, { params: {}, body }),
    onSuccess: (me) => client.setQueryData(ME, me),
  });
}
