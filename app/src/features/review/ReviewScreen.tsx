import { useQuery } from "@tanstack/react-query";
import { useLocalSearchParams } from "expo-router";
import { StyleSheet, View } from "react-native";
import { commentsQuery } from "@/api/comments.ts";
import { revisionsQuery } from "@/api/revisions.ts";
import { useWorkshop } from "@/features/session/index.ts";
import { useStudy } from "@/features/study/index.ts";
import { ErrorState } from "@/ui/ErrorState.tsx";
import { Loading } from "@/ui/Loading.tsx";
import { Panel } from "@/ui/Panel.tsx";
import { space } from "@/ui/theme/tokens.ts";
import { useIsWide } from "@/ui/useMediaQuery.ts";
import { CommentForm } from "./components/CommentForm.tsx";
import { CommentList } from "./components/CommentList.tsx";
import { RevisionList } from "./components/RevisionList.tsx";
import { WriteComment } from "./components/WriteComment.tsx";

/** Comments and revisions. `?point=` in the address chooses what a new comment is pinned to. */
export function ReviewScreen() {
  const { workshopId, studyId } = useStudy();
  const { may } = useWorkshop();
  const { point } = useLocalSearchParams<{ point?: string }>();
  const isWide = useIsWide();
  const comments = useQuery(commentsQuery(workshopId, studyId));
  const revisions = useQuery(revisionsQuery(workshopId, studyId));
  const error = comments.error ?? revisions.error;
  const retry = () => Promise.all([comments.refetch(), revisions.refetch()]);
  const known = revisions.data ?? [];
  const list = (
    <>
      {error ? <ErrorState title="The review could not be loaded" error={error} onRetry={retry} /> : null}
      {comments.isPending ? <Loading label="Loading the comments" rowHeight={96} /> : null}
      {comments.data ? <CommentList comments={comments.data} /> : null}
    </>
  );
  const history = revisions.data ? <RevisionList revisions={revisions.data} /> : null;
  if (!isWide) {
    return (
      <View style={styles.screen}>
        {may("comment.write") ? <WriteComment key={point} revisions={known} point={point} /> : null}
        {list}
        {history}
      </View>
    );
  }
  return (
    <View style={[styles.screen, styles.wide]}>
      <View style={styles.aside}>
        {may("comment.write") ? (
          <Panel title="Write a comment">
            <CommentForm key={point} revisions={known} point={point} />
          </Panel>
        ) : null}
        {history}
      </View>
      <View style={styles.comments}>{list}</View>
    </View>
  );
}

const styles = StyleSheet.create({
  screen: { width: "100%", maxWidth: 1200, alignSelf: "center", padding: space.l, gap: space.xl },
  wide: { flexDirection: "row", alignItems: "flex-start", padding: space.xl },
  aside: { width: 400, flexShrink: 0, gap: space.xl },
  comments: { flex: 1, minWidth: 0, gap: space.xl },
});
