import { zodResolver } from "@hookform/resolvers/zod";
import { type Build, CreateBuildRequest } from "@linkwright/contract";
import { useRouter } from "expo-router";
import { useState } from "react";
import { Controller, useForm } from "react-hook-form";
import { StyleSheet, View } from "react-native";
import { useCreateBuild, useRenameBuild } from "@/api/builds.ts";
import { useWorkshop } from "@/features/session/index.ts";
import { makeId } from "@/lib/ids.ts";
import { Button } from "@/ui/Button.tsx";
import { Dialog } from "@/ui/Dialog.tsx";
import { DomForm } from "@/ui/dom.tsx";
import { ErrorState } from "@/ui/ErrorState.tsx";
import { TextArea, TextField } from "@/ui/TextField.tsx";
import { space } from "@/ui/theme/tokens.ts";

interface BuildDialogProps {
  /** The build that is changed; without one a new one is made. */
  readonly build?: Build;
  readonly onClose: () => void;
}

export function BuildDialog({ build, onClose }: BuildDialogProps) {
  const { workshopId } = useWorkshop();
  const router = useRouter();
  const create = useCreateBuild(workshopId);
  const rename = useRenameBuild(workshopId, build?.id ?? "");
  const [newId] = useState(makeId);
  const { control, handleSubmit } = useForm({
    resolver: zodResolver(CreateBuildRequest),
    defaultValues: { id: build?.id ?? newId, name: build?.name ?? "", summary: build?.summary ?? "" },
  });
  const submit = handleSubmit(({ id, name, summary }) => {
    if (build) return rename.mutate({ name, summary }, { onSuccess: onClose });
    create.mutate(
      { id, name, summary },
      { onSuccess: () => router.navigate({ pathname: "/builds/[buildId]", params: { buildId: id } }) },
    );
  });
  const error = create.error ?? rename.error;
  return (
    <Dialog title={build ? "Name and description" : "New build"} onClose={onClose}>
      <DomForm onSubmit={submit} aria-label={build ? "Name and description" : "New build"}>
        <View style={styles.form}>
          <Controller
            control={control}
            name="name"
            render={({ field, fieldState }) => (
              <TextField
                {...field}
                label="Name"
                help="The vehicle or the kit, e.g. Hill-climb special"
                autoComplete="off"
                autoFocus
                error={fieldState.error?.message}
              />
            )}
          />
          <Controller
            control={control}
            name="summary"
            render={({ field, fieldState }) => (
              <TextArea
                {...field}
                value={field.value ?? ""}
                label="Description"
                help="What it is and which bought parts it uses. May stay empty."
                error={fieldState.error?.message}
              />
            )}
          />
          {error ? (
            <ErrorState
              title={build ? "The build was not changed" : "The build was not made"}
              error={error}
            />
          ) : null}
          <View style={styles.actions}>
            <Button label="Cancel" onPress={onClose} />
            <Button
              submit
              kind="primary"
              label={build ? "Save" : "Make the build"}
              busyLabel="Saving…"
              busy={create.isPending || rename.isPending}
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
