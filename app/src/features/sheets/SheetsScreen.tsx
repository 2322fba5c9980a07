import { useQuery } from "@tanstack/react-query";
import { StyleSheet, View } from "react-native";
import { revisionsQuery } from "@/api/revisions.ts";
import { sheetsQuery } from "@/api/sheets.ts";
import { useWorkshop } from "@/features/session/index.ts";
import { SaveRevisionButton, useStudy } from "@/features/study/index.ts";
import { EmptyState } from "@/ui/EmptyState.tsx";
import { ErrorState } from "@/ui/ErrorState.tsx";
import { Loading } from "@/ui/Loading.tsx";
import { space } from "@/ui/theme/tokens.ts";
import { useIsWide } from "@/ui/useMediaQuery.ts";
import { SheetForm } from "./components/SheetForm.tsx";
import { SheetList } from "./components/SheetList.tsx";

export function SheetsScreen() {
  const { workshopId, studyId } = useStudy();
  const { may } = useWorkshop();
  const isWide = useIsWide();
  const revisions = useQuery(revisionsQuery(workshopId, studyId));
  const sheets = useQuery(sheetsQuery(workshopId, studyId));
  const error = revisions.error ?? sheets.error;
  const retry = () => Promise.all([revisions.refetch(), sheets.refetch()]);
  if (error && !(revisions.data && sheets.data)) {
    return (
      <View style={styles.screen}>
        <ErrorState title="The sheets could not be loaded" error={error} onRetry={retry} />
      </View>
    );
  }
  if (!revisions.data || !sheets.data) {
    return (
      <View style={styles.screen}>
        <Loading label="Loading the sheets" rowHeight={72} />
      </View>
    );
  }
  if (revisions.data.length === 0) {
    return (
      <View style={styles.screen}>
        <EmptyState title="Nothing to make a sheet of yet" action={<SaveRevisionButton />}>
          A sheet is made from a revision, so that the numbers on the jig can always be found again. Save the
          draft as a revision first.
        </EmptyState>
      </View>
    );
  }
  return (
    <View style={[styles.screen, isWide && styles.wide]}>
      {may("sheet.make") ? (
        <View style={isWide ? styles.form : null}>
          <SheetForm revisions={revisions.data} />
        </View>
      ) : null}
      <View style={styles.list}>
        <SheetList sheets={sheets.data.sheets} revisions={revisions.data} mayMake={may("sheet.make")} />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  screen: { width: "100%", maxWidth: 1200, alignSelf: "center", padding: space.l, gap: space.xl },
  wide: { flexDirection: "row", alignItems: "flex-start", padding: space.xl },
  form: { width: 380, flexShrink: 0 },
  list: { flex: 1, minWidth: 0 },
});
