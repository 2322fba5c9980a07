import { zodResolver } from "@hookform/resolvers/zod";
import { Name } from "@linkwright/contract";
import { Controller, useForm } from "react-hook-form";
import { StyleSheet, View } from "react-native";
import { z } from "zod";
import { Button } from "@/ui/Button.tsx";
import { DomForm } from "@/ui/dom.tsx";
import { TextField } from "@/ui/TextField.tsx";
import { space } from "@/ui/theme/tokens.ts";

const NameRequest = z.strictObject({ name: Name });

interface NameFormProps {
  readonly name: string;
  readonly onSave: (name: string) => Promise<unknown>;
}

export function NameForm({ name, onSave }: NameFormProps) {
  const { control, handleSubmit, reset, formState } = useForm({
    resolver: zodResolver(NameRequest),
    defaultValues: { name },
  });
  const submit = handleSubmit((request) =>
    onSave(request.name).then(
      () => reset(request),
      () => undefined, // the screen tells it; what was typed stays
    ),
  );
  return (
    <DomForm onSubmit={submit} aria-label="Your name">
      <View style={styles.form}>
        <Controller
          control={control}
          name="name"
          render={({ field, fieldState }) => (
            <TextField
              {...field}
              label="Your name"
              help="Stands beside your comments and revisions."
              autoComplete="name"
              error={fieldState.error?.message}
            />
          )}
        />
        <View style={styles.actions}>
          <Button
            submit
            kind="primary"
            label="Save the name"
            busyLabel="Saving…"
            busy={formState.isSubmitting}
            disabled={!formState.isDirty}
          />
        </View>
      </View>
    </DomForm>
  );
}

const styles = StyleSheet.create({ form: { gap: space.l }, actions: { flexDirection: "row" } });
