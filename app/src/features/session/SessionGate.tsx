import type { Me } from "@linkwright/contract";
import { useQuery, useQueryClient } from "@tanstack/react-query";
import { Redirect } from "expo-router";
import { type ReactNode, useEffect, useRef, useState } from "react";
import { meQuery } from "@/api/auth.ts";
import { isProblem } from "@/lib/problem.ts";
import { readStored, writeStored } from "@/lib/storage.ts";
import { EmptyState } from "@/ui/EmptyState.tsx";
import { ErrorState } from "@/ui/ErrorState.tsx";
import { Loading } from "@/ui/Loading.tsx";
import { Page } from "@/ui/Page.tsx";
import { useTheme } from "@/ui/theme/ThemeProvider.tsx";
import { SignInAgainDialog } from "./SignInAgainDialog.tsx";
import { buildWorkshop, PersonContext, WorkshopContext } from "./workshop.ts";

const WORKSHOP_KEY = "linkwright.workshop";

/** Lets through whoever is signed in; others go to sign in and come back to where they wanted. */
export function SessionGate({ children }: { children: ReactNode }) {
  const { data: me, error, isPending, refetch } = useQuery(meQuery);
  // The address itself: the router knows no path yet while its routes are still being loaded.
  const [wanted] = useState(() => window.location.pathname + window.location.search);
  const lastMe = useRef<Me | null>(null);
  useExpiryWatch();

  if (me) lastMe.current = me;
  const person = me ?? lastMe.current;
  if (!person && error) {
    return (
      <Page title="Linkwright">
        <ErrorState title="Your workshop could not be opened" error={error} onRetry={refetch} />
      </Page>
    );
  }
  if (!person && isPending) {
    return (
      <Page title="Linkwright">
        <Loading label="Opening your workshop" />
      </Page>
    );
  }
  if (!person) return <Redirect href={{ pathname: "/sign-in", params: { next: wanted } }} />;
  return (
    <PersonContext.Provider value={person}>
      <WorkshopScope me={person}>{children}</WorkshopScope>
      {me === null ? <SignInAgainDialog person={person} /> : null}
    </PersonContext.Provider>
  );
}

function WorkshopScope({ me, children }: { me: Me; children: ReactNode }) {
  const [chosenId, setChosenId] = useState(() => readStored(WORKSHOP_KEY));
  const { chooseTheme } = useTheme();
  const { theme } = me.preferences;
  useEffect(() => chooseTheme(theme), [theme, chooseTheme]);

  const workshop = buildWorkshop(me, chosenId, (workshopId) => {
    writeStored(WORKSHOP_KEY, workshopId);
    setChosenId(workshopId);
  });
  if (!workshop) {
    return (
      <Page title="No workshop">
        <EmptyState title="You belong to no workshop at the moment">
          Ask the owner of a workshop to take you in, or sign up with another address to make one of your own.
        </EmptyState>
      </Page>
    );
  }
  return <WorkshopContext.Provider value={workshop}>{children}</WorkshopContext.Provider>;
}

/** A session that ends while a page is open shows in whatever request comes next. */
function useExpiryWatch() {
  const client = useQueryClient();
  useEffect(() => {
    const noticed = (error: unknown) => {
      if (isProblem(error, "not_signed_in")) client.setQueryData(meQuery.queryKey, null);
    };
    const stopQueries = client.getQueryCache().subscribe((event) => {
      if (event.type === "updated" && event.action.type === "error") noticed(event.action.error);
    });
    const stopMutations = client.getMutationCache().subscribe((event) => {
      if (event.type === "updated" && event.action.type === "error") noticed(event.action.error);
    });
    return () => {
      stopQueries();
      stopMutations();
    };
  }, [client]);
}
