import { useCurrentPerson, useWorkshop } from "@/features/session/index.ts";
import { Button } from "@/ui/Button.tsx";
import { LinkButton } from "@/ui/Link.tsx";

/** Where to look for what is not in this workshop: its builds, or the person's other workshops. */
export function ElsewhereLinks() {
  const { memberships } = useCurrentPerson();
  const { workshopId, choose } = useWorkshop();
  const others = memberships.filter((membership) => membership.workshopId !== workshopId);
  return (
    <>
      <LinkButton href="/builds" label="Go to the builds" />
      {others.map((other) => (
        <Button
          key={other.workshopId}
          label={`Look in ${other.workshopName}`}
          onPress={() => choose(other.workshopId)}
        />
      ))}
    </>
  );
}
