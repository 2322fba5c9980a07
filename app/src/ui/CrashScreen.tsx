import type { ErrorBoundaryProps } from "expo-router";
import { ErrorState } from "./ErrorState.tsx";
import { Page } from "./Page.tsx";

/** What stands in place of a page whose own code failed. */
export function ErrorBoundary({ error, retry }: ErrorBoundaryProps) {
  return (
    <Page title="This page has stopped" width="reading">
      <ErrorState title="This page has stopped" error={error} onRetry={retry} />
    </Page>
  );
}
