import { useQuery } from "@tanstack/react-query";
import { useState } from "react";
import { buildQuery } from "@/api/builds.ts";
import { studiesQuery } from "@/api/studies.ts";
import { ElsewhereLinks, ShopFrame } from "@/features/frame/index.ts";
import { useWorkshop } from "@/features/session/index.ts";
import { Button } from "@/ui/Button.tsx";
import { Crumb } from "@/ui/Crumb.tsx";
import { EmptyState } from "@/ui/EmptyState.tsx";
import { ErrorState } from "@/ui/ErrorState.tsx";
import { Loading } from "@/ui/Loading.tsx";
import { Page } from "@/ui/Page.tsx";
import { BuildDialog } from "./components/BuildDialog.tsx";
import { CardGrid } from "./components/CardGrid.tsx";
import { StudyCard } from "./components/StudyCard.tsx";
import { StudyDialog } from "./components/StudyDialog.tsx";

export function BuildScreen({ buildId }: { buildId: string }) {
  const { workshopId, may } = useWorkshop();
  const build = useQuery(buildQuery(workshopId, buildId));
  const [open, setOpen] = useState<"none" | "study" | "rename">("none");
  const close = () => setOpen("none");
  const newStudy = <Button kind="primary" label="New study" onPress={() => setOpen("study")} />;
  return (
    <ShopFrame>
      <Page
        title={build.data?.name ?? "Build"}
        intro={build.data?.summary}
        crumb={<Crumb href="/builds" label="Builds" />}
        actions={
          build.data ? (
            <>
              {may("build.edit") ? (
                <Button label="Rename" accessibleLabel="Rename the build" onPress={() => setOpen("rename")} />
              ) : null}
              {may("study.edit") ? newStudy : null}
            </>
          ) : null
        }
      >
        {build.error ? (
          <ErrorState
            title="This build could not be opened"
            error={build.error}
            onRetry={build.refetch}
            actions={<ElsewhereLinks />}
          />
        ) : (
          <Studies buildId={buildId} />
        )}
      </Page>
      {open === "study" ? <StudyDialog buildId={buildId} onClose={close} /> : null}
      {open === "rename" && build.data ? <BuildDialog build={build.data} onClose={close} /> : null}
    </ShopFrame>
  );
}

function Studies({ buildId }: { buildId: string }) {
  const { workshopId, may } = useWorkshop();
  const studies = useQuery(studiesQuery(workshopId, buildId));
  if (studies.isPending) return <Loading label="Loading the studies" rowHeight={132} />;
  if (studies.error)
    return (
      <ErrorState title="The studies could not be loaded" error={studies.error} onRetry={studies.refetch} />
    );
  if (studies.data.length === 0) {
    return (
      <EmptyState title="No study yet">
        {may("study.edit")
          ? "A study is one axle, front or rear, or a variant of one. Make the first with New study."
          : "An engineer of this workshop makes the studies; they will stand here for you to read."}
      </EmptyState>
    );
  }
  return (
    <CardGrid>
      {studies.data.map((study) => (
        <StudyCard key={study.id} study={study} />
      ))}
    </CardGrid>
  );
}
