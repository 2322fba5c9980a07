import { formatPath } from "@linkwright/kinematics";
import type { ReactNode } from "react";
import { View } from "react-native";
import { explain, isProblem } from "@/lib/problem.ts";
import { Button } from "./Button.tsx";
import { Notice } from "./Notice.tsx";
import { Text } from "./Text.tsx";

interface ErrorStateProps {
  /** What was being done, e.g. "The builds could not be loaded". */
  readonly title: string;
  readonly error: unknown;
  readonly onRetry?: () => unknown;
  readonly actions?: ReactNode;
}

/** What went wrong, where, and what to do about it. */
export function ErrorState({ title, error, onRetry, actions }: ErrorStateProps) {
  const { detail, advice, reference } = explain(error);
  // What is not there, or not for this person, will not be so in a moment either.
  const isFinal = isProblem(error, "not_found", "not_allowed");
  const retry =
    onRetry && !isFinal ? <Button label="Try again" busyLabel="Trying…" onPress={onRetry} /> : null;
  return (
    <Notice
      kind="fault"
      live
      title={title}
      actions={
        retry || actions ? (
          <>
            {retry}
            {actions}
          </>
        ) : null
      }
    >
      <Text>{detail}</Text>
      <IssueList error={error} />
      {advice ? <Text>{advice}</Text> : null}
      {reference && !isFinal ? (
        <Text variant="figureSmall" tone="inkSoft">
          {`Reference ${reference}`}
        </Text>
      ) : null}
    </Notice>
  );
}

function IssueList({ error }: { error: unknown }) {
  if (!isProblem(error) || error.issues.length === 0) return null;
  return (
    <View role="list">
      {error.issues.map((issue) => (
        <View role="listitem" key={`${formatPath(issue.path)} ${issue.problem}`}>
          <Text variant="small">
            <Text variant="figureSmall">{formatPath(issue.path)}</Text>
            {` ${issue.problem} ${issue.hint}`}
          </Text>
        </View>
      ))}
    </View>
  );
}
