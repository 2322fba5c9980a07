import type { Comment } from "@linkwright/contract";
import { StyleSheet, View } from "react-native";
import { useSettleComment } from "@/api/comments.ts";
import { useCurrentPerson, usePreferences, useWorkshop } from "@/features/session/index.ts";
import { hardpointInWords, useStudy } from "@/features/study/index.ts";
import { formatDateTime } from "@/lib/format.ts";
import { Button } from "@/ui/Button.tsx";
import { ErrorState } from "@/ui/ErrorState.tsx";
import { PunchMark } from "@/ui/PunchMark.tsx";
import { Text } from "@/ui/Text.tsx";
import { color, space } from "@/ui/theme/tokens.ts";

export function CommentItem({ comment }: { comment: Comment }) {
  const { workshopId, study } = useStudy();
  const { words, locale } = usePreferences();
  const person = useCurrentPerson();
  const { maySettleComment } = useWorkshop();
  const settle = useSettleComment(workshopId);
  const { pin, text, createdBy, createdAt, revision, resolvedBy, resolvedAt } = comment;
  const isResolved = resolvedAt !== null;
  const about = pin.type === "study" ? "The whole study" : hardpointInWords(study.axle, pin.path, words);
  const where = revision === null ? "on the draft" : `on revision ${revision}`;
  const toggle = () =>
    settle.mutateAsync({ commentId: comment.id, resolved: !isResolved }).catch(() => undefined);
  return (
    <View role="listitem" style={styles.item}>
      <View style={styles.head}>
        {pin.type === "hardpoint" ? <PunchMark tone="dye" /> : null}
        <Text variant="tableHead">{about}</Text>
      </View>
      <Text>{text}</Text>
      <View style={styles.foot}>
        <Text variant="small" tone="inkSoft" style={styles.who}>
          {`${createdBy.name}, ${formatDateTime(createdAt, { locale })}, ${where}`}
          {isResolved
            ? `. Resolved by ${resolvedBy?.name ?? "someone"}, ${formatDateTime(resolvedAt, { locale })}`
            : ""}
        </Text>
        {maySettleComment(createdBy.id === person.id) ? (
          <Button
            kind="quiet"
            label={isResolved ? "Reopen" : "Resolve"}
            accessibleLabel={`${isResolved ? "Reopen" : "Resolve"} the comment of ${createdBy.name} about ${about}`}
            busyLabel={isResolved ? "Reopening…" : "Resolving…"}
            onPress={toggle}
          />
        ) : null}
      </View>
      {settle.error ? (
        <ErrorState title="The comment was not changed" error={settle.error} onRetry={toggle} />
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  item: {
    paddingHorizontal: space.l,
    paddingTop: space.l,
    paddingBottom: space.xs,
    gap: space.xs,
    borderTopWidth: 1,
    borderTopColor: color.rule,
    marginTop: -1,
  },
  head: { flexDirection: "row", alignItems: "center", gap: space.xs + 2 },
  foot: {
    flexDirection: "row",
    flexWrap: "wrap",
    alignItems: "center",
    justifyContent: "space-between",
    gap: space.s,
    minHeight: 44,
  },
  who: { flexShrink: 1 },
});
