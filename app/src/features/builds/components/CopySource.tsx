import { useQuery } from "@tanstack/react-query";
import { useState } from "react";
import { buildsQuery } from "@/api/builds.ts";
import { studiesQuery } from "@/api/studies.ts";
import { useWorkshop } from "@/features/session/index.ts";
import { ErrorState } from "@/ui/ErrorState.tsx";
import { Select } from "@/ui/Select.tsx";

interface CopySourceProps {
  /** Where one looks first. */
  readonly buildId: string;
  readonly value: string;
  readonly onChange: (studyId: string) => void;
  readonly error?: string | undefined;
}

/** A study of this build or of any other of the workshop. */
export function CopySource({ buildId, value, onChange, error }: CopySourceProps) {
  const { workshopId } = useWorkshop();
  const [fromBuild, setFromBuild] = useState(buildId);
  const builds = useQuery(buildsQuery(workshopId));
  const studies = useQuery(studiesQuery(workshopId, fromBuild));
  const failure = builds.error ?? studies.error;
  if (failure) {
    const retry = () => Promise.all([builds.refetch(), studies.refetch()]);
    return <ErrorState title="The studies to copy could not be loaded" error={failure} onRetry={retry} />;
  }
  const choices = studies.data?.map(({ id, name }) => ({ value: id, label: name })) ?? [];
  const first = {
    value: "",
    label: studies.isPending
      ? "Loading…"
      : choices.length === 0
        ? "This build has no study"
        : "Choose a study",
  };
  return (
    <>
      <Select
        label="From the build"
        value={fromBuild}
        options={builds.data?.map(({ id, name }) => ({ value: id, label: name })) ?? []}
        onChange={(next) => {
          setFromBuild(next);
          onChange("");
        }}
      />
      <Select
        label="Study"
        help="Its draft is copied as it stands; the two go separate ways from then on."
        value={value}
        options={[first, ...choices]}
        onChange={onChange}
        error={error}
      />
    </>
  );
}
