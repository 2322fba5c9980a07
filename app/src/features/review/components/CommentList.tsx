import type { Comment } from "@linkwright/contract";
import { useState } from "react";
import { StyleSheet, View } from "react-native";
import { Choice } from "@/ui/Choice.tsx";
import { EmptyState } from "@/ui/EmptyState.tsx";
import { Panel } from "@/ui/Panel.tsx";
import { CommentItem } from "./CommentItem.tsx";

type Shown = "open" | "resolved";

export function CommentList({ comments }: { comments: readonly Comment[] }) {
  const [shown, setShown] = useState<Shown>("open");
  const open = comments.filter(({ resolvedAt }) => resolvedAt === null);
  const resolved = comments.filter(({ resolvedAt }) => resolvedAt !== null);
  const listed = shown === "open" ? open : resolved;
  const options = [
    { value: "open", label: `Open (${open.length})` },
    { value: "resolved", label: `Resolved (${resolved.length})` },
  ] as const;
  return (
    <Panel
      title="Comments"
      flush
      aside={
        <Choice
          label="Which comments"
          hideLabel
          compact
          value={shown}
          options={options}
          onChange={setShown}
        />
      }
    >
      {listed.length === 0 ? (
        <View style={styles.empty}>
          <EmptyState level={3} title={shown === "open" ? "No open comment" : "Nothing resolved yet"}>
            {shown === "open"
              ? "A comment is about the whole study or pinned to one hardpoint, and stays open until it is resolved."
              : "Comments that have been dealt with are kept here."}
          </EmptyState>
        </View>
      ) : (
        <View role="list" style={styles.list}>
          {listed.map((comment) => (
            <CommentItem key={comment.id} comment={comment} />
          ))}
        </View>
      )}
    </Panel>
  );
}

const styles = StyleSheet.create({ list: { margin: 0, padding: 0 }, empty: { padding: 16 } });
