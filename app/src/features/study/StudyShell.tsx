import type { StudyAnswer } from "@linkwright/contract";
import { useQuery } from "@tanstack/react-query";
import { Redirect } from "expo-router";
import type { ReactNode } from "react";
import { buildQuery } from "@/api/builds.ts";
import { studyQuery } from "@/api/studies.ts";
import { ElsewhereLinks, ShopFrame } from "@/features/frame/index.ts";
import { useCurrentPerson, useWorkshop } from "@/features/session/index.ts";
import { Crumb } from "@/ui/Crumb.tsx";
import { ErrorState } from "@/ui/ErrorState.tsx";
import { Loading } from "@/ui/Loading.tsx";
import { Page } from "@/ui/Page.tsx";
import { StudyFrame } from "./components/StudyFrame.tsx";
import { StudyProvider } from "./StudyContext.tsx";
import { useOpenStudy } from "./useOpenStudy.ts";

interface StudyShellProps {
  readonly buildId: string;
  readonly studyId: string;
  /** The screen that is shown; the document stays open while one goes from screen to screen. */
  readonly children: ReactNode;
}

/** Opens a study and holds it open for its screens. */
export function StudyShell({ buildId, studyId, children }: StudyShellProps) {
  const { workshopId } = useWorkshop();
  const study = useQuery(studyQuery(workshopId, studyId));
  const build = useQuery(buildQuery(workshopId, buildId));
  if (study.data && study.data.buildId === buildId) {
    return (
      <OpenStudyShell loaded={study.data} buildName={build.data?.name ?? "Build"}>
        {children}
      </OpenStudyShell>
    );
  }
  if (study.data) {
    const params = { buildId: study.data.buildId, studyId };
    return <Redirect href={{ pathname: "/builds/[buildId]/studies/[studyId]", params }} />;
  }
  return (
    <ShopFrame>
      <Page title="Study" crumb={<Crumb href="/builds" label="Builds" />}>
        {study.error ? (
          <ErrorState
            title="This study could not be opened"
            error={study.error}
            onRetry={study.refetch}
            actions={<ElsewhereLinks />}
          />
        ) : (
          <Loading label="Opening the study" rowHeight={120} />
        )}
      </Page>
    </ShopFrame>
  );
}

interface OpenStudyShellProps {
  readonly loaded: StudyAnswer;
  readonly buildName: string;
  readonly children: ReactNode;
}

function OpenStudyShell({ loaded, buildName, children }: OpenStudyShellProps) {
  const { workshopId, may } = useWorkshop();
  const person = useCurrentPerson();
  const handle = useOpenStudy({ workshopId, personId: person.id, loaded });
  const place = { workshopId, buildId: loaded.buildId, studyId: loaded.id };
  return (
    <StudyProvider place={place} handle={handle} mayEdit={may("study.edit")}>
      <StudyFrame study={loaded} buildName={buildName}>
        {children}
      </StudyFrame>
    </StudyProvider>
  );
}
