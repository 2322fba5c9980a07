import {
  authRoutes,
  type ChangeMeRequest,
  type Me,
  type SignInRequest,
  type SignUpRequest,
} from "@linkwright/contract";
import { type QueryClient, queryOptions, useMutation, useQueryClient } from "@tanstack/react-query";
import { isProblem } from "@/lib/problem.ts";
import { callApi } from "./client.ts";

const ME = ["me"] as const;

/** Null when nobody is signed in: an answer, not an error. */
export const meQuery = queryOptions({
  queryKey: ME,
  queryFn: async ({ signal }): Promise<Me | null> => {
    try {
      return await callApi(authRoutes.me, { params: {}, signal });
    } catch (error) {
      if (isProblem(error, "not_signed_in")) return null;
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

export function useSignIn() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: SignInRequest) => callApi(authRoutes.signIn, { params: {}, body }),
    onSuccess: (me) => {
      // Whatever another person had loaded on this device goes first.
      forgetAllButMe(client);
      client.setQueryData(ME, me);
    },
  });
}

export function useSignOut() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () => callApi(authRoutes.signOut, { params: {} }),
    onSuccess: () => {
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
