import { zodResolver } from "@hookform/resolvers/zod";
import { type CreateStudyRequest, Name } from "@linkwright/contract";
import { useRouter } from "expo-router";
import { useState } from "react";
import { Controller, useForm } from "react-hook-form";
import { StyleSheet, View } from "react-native";
import { z } from "zod";
import { useCreateStudy } from "@/api/studies.ts";
import { useWorkshop } from "@/features/session/index.ts";
import { makeId } from "@/lib/ids.ts";
import { Button } from "@/ui/Button.tsx";
import { Choice } from "@/ui/Choice.tsx";
import { Dialog } from "@/ui/Dialog.tsx";
import { DomForm } from "@/ui/dom.tsx";
import { ErrorState } from "@/ui/ErrorState.tsx";
import { TextField } from "@/ui/TextField.tsx";
import { space } from "@/ui/theme/tokens.ts";
import { startingStudy } from "../startingStudy.ts";
import { CopySource } from "./CopySource.tsx";

const StudyForm = z
  .strictObject({
    name: Name,
    start: z.enum(["blank", "copy"]),
    position: z.enum(["front", "rear"]),
    copyOf: z.string(),
  })
  .refine(({ start, copyOf }) => start === "blank" || copyOf !== "", {
    path: ["copyOf"],
    message: "Choose the study to copy",
  });
type StudyForm = z.infer<typeof StudyForm>;

const STARTS = [
  { value: "blank", label: "Starting axle" },
  { value: "copy", label: "Copy of a study" },
] as const;
const POSITIONS = [
  { value: "front", label: "Front, with a rack" },
  { value: "rear", label: "Rear, fixed link" },
] as const;

function sourceOf({ name, start, position, copyOf }: StudyForm): CreateStudyRequest["source"] {
  return start === "copy"
    ? { type: "copy", studyId: copyOf }
    : { type: "document", study: startingStudy(name, position) };
}

export function StudyDialog({ buildId, onClose }: { buildId: string; onClose: () => void }) {
  const { workshopId } = useWorkshop();
  const router = useRouter();
  const create = useCreateStudy(workshopId, buildId);
  const [id] = useState(makeId);
  const { control, handleSubmit, watch } = useForm<StudyForm>({
    resolver: zodResolver(StudyForm),
    defaultValues: { name: "", start: "blank", position: "front", copyOf: "" },
  });
  const submit = handleSubmit((form) =>
    create.mutate(
      { id, name: form.name, source: sourceOf(form) },
      {
        onSuccess: () =>
          router.navigate({
            pathname: "/builds/[buildId]/studies/[studyId]/points",
            params: { buildId, studyId: id },
          }),
      },
    ),
  );
  const isCopy = watch("start") === "copy";
  return (
    <Dialog title="New study" onClose={onClose}>
      <DomForm onSubmit={submit} aria-label="New study">
        <View style={styles.form}>
          <Controller
            control={control}
            name="name"
            render={({ field, fieldState }) => (
              <TextField
                {...field}
                label="Name"
                help="The axle or the variant, e.g. Front axle, short rack"
                autoComplete="off"
                autoFocus
                error={fieldState.error?.message}
              />
            )}
          />
          <Controller
            control={control}
            name="start"
            render={({ field }) => (
              <Choice label="Begin with" value={field.value} options={STARTS} onChange={field.onChange} />
            )}
          />
          {isCopy ? (
            <Controller
              control={control}
              name="copyOf"
              render={({ field, fieldState }) => (
                <CopySource
                  buildId={buildId}
                  value={field.value}
                  onChange={field.onChange}
                  error={fieldState.error?.message}
                />
              )}
            />
          ) : (
            <Controller
              control={control}
              name="position"
              render={({ field }) => (
                <Choice label="Axle" value={field.value} options={POSITIONS} onChange={field.onChange} />
              )}
            />
          )}
          {create.error ? <ErrorState title="The study was not made" error={create.error} /> : null}
          <View style={styles.actions}>
            <Button label="Cancel" onPress={onClose} />
            <Button
              submit
              kind="primary"
              label="Make the study"
              busyLabel="Making it…"
              busy={create.isPending}
            />
          </View>
        </View>
      </DomForm>
    </Dialog>
  );
}

const styles = StyleSheet.create({
  form: { gap: space.l },
  actions: { flexDirection: "row", justifyContent: "flex-end", gap: space.m },
});
