import { useQuery } from "@tanstack/react-query";
import { type ReactNode, useState } from "react";
import { View } from "react-native";
import { buildsQuery } from "@/api/builds.ts";
import { ShopFrame } from "@/features/frame/index.ts";
import { useWorkshop } from "@/features/session/index.ts";
import { Button } from "@/ui/Button.tsx";
import { EmptyState } from "@/ui/EmptyState.tsx";
import { ErrorState } from "@/ui/ErrorState.tsx";
import { Loading } from "@/ui/Loading.tsx";
import { Page } from "@/ui/Page.tsx";
import { BuildCard } from "./components/BuildCard.tsx";
import { BuildDialog } from "./components/BuildDialog.tsx";
import { CardGrid } from "./components/CardGrid.tsx";

export function BuildsScreen() {
  const { workshopId, may } = useWorkshop();
  const builds = useQuery(buildsQuery(workshopId));
  const [isCreating, setIsCreating] = useState(false);
  const mayCreate = may("build.edit");
  const create = <Button kind="primary" label="New build" onPress={() => setIsCreating(true)} />;
  return (
    <ShopFrame>
      <Page
        title="Builds"
        intro="A build is a vehicle or a kit. It holds the studies of its axles."
        actions={mayCreate && builds.data?.length ? create : null}
      >
        {builds.isPending ? <Loading label="Loading the builds" rowHeight={116} /> : null}
        {builds.error ? (
          <ErrorState title="The builds could not be loaded" error={builds.error} onRetry={builds.refetch} />
        ) : null}
        {builds.data?.length === 0 ? <NoBuilds mayCreate={mayCreate} action={create} /> : null}
        {builds.data?.length ? (
          <CardGrid>
            {builds.data.map((build) => (
              <BuildCard key={build.id} build={build} />
            ))}
          </CardGrid>
        ) : null}
      </Page>
      {isCreating ? <BuildDialog onClose={() => setIsCreating(false)} /> : null}
    </ShopFrame>
  );
}

function NoBuilds({ mayCreate, action }: { mayCreate: boolean; action: ReactNode }) {
  return (
    <View>
      {mayCreate ? (
        <EmptyState title="No build yet" action={action}>
          Begin with the vehicle or kit you are working on. Its axles come next, as studies.
        </EmptyState>
      ) : (
        <EmptyState title="No build yet">
          Builds that an engineer of this workshop makes will stand here for you to read.
        </EmptyState>
      )}
    </View>
  );
}
