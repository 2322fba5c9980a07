import { zodResolver } from "@hookform/resolvers/zod";
import type { LengthUnit } from "@linkwright/contract";
import type { Issue } from "@linkwright/kinematics";
import { type ReactNode, useState } from "react";
import { Controller, useForm } from "react-hook-form";
import { StyleSheet, View } from "react-native";
import type { z } from "zod";
import { Button } from "@/ui/Button.tsx";
import { Dialog } from "@/ui/Dialog.tsx";
import { DomForm } from "@/ui/dom.tsx";
import { Notice } from "@/ui/Notice.tsx";
import { Text } from "@/ui/Text.tsx";
import { space } from "@/ui/theme/tokens.ts";
import { unitFor } from "./fieldKinds.ts";
import { type FormField, type FormValues, formSchema, formValues } from "./formSchema.ts";
import { NumberText } from "./NumberText.tsx";

interface PartDialogProps<Part> {
  readonly title: string;
  readonly saveLabel?: string;
  readonly intro?: string;
  readonly fields: readonly FormField[];
  readonly given: Readonly<Record<string, unknown>>;
  readonly units: LengthUnit;
  readonly empty?: null;
  readonly shape?: (values: Readonly<Record<string, unknown>>) => unknown;
  readonly part: z.ZodType<Part>;
  /** Makes the change, or tells why the study could not be built with it. */
  readonly onSave: (part: Part) => readonly Issue[];
  readonly onClose: () => void;
  /** Above the fields. */
  readonly children?: ReactNode;
}

/** A part of the document as a form: nothing of it changes until all of it can. */
export function PartDialog<Part>(props: PartDialogProps<Part>) {
  const { title, intro, fields, given, units, shape, part, onSave, onClose, children } = props;
  const [issues, setIssues] = useState<readonly Issue[]>([]);
  const schema = formSchema({
    fields,
    given,
    units,
    empty: props.empty,
    part,
    ...(shape && { shape }),
  });
  const { control, handleSubmit, formState } = useForm<FormValues, unknown, Part>({
    resolver: zodResolver(schema),
    defaultValues: formValues(fields, given, units),
  });
  const save = handleSubmit((values: Part) => {
    const found = onSave(values);
    setIssues(found);
    if (found.length === 0) onClose();
  });
  const rootMessage = messagesBeside(formState.errors, fields);
  return (
    <Dialog
      title={title}
      onClose={onClose}
      actions={
        <>
          <Button label="Cancel" onPress={onClose} />
          <Button kind="primary" label={props.saveLabel ?? "Save"} onPress={save} />
        </>
      }
    >
      <DomForm aria-label={title} onSubmit={save}>
        <View style={styles.fields}>
          {intro ? (
            <Text variant="small" tone="inkSoft">
              {intro}
            </Text>
          ) : null}
          {children}
          {fields.map((field) => (
            <Controller
              key={field.name}
              control={control}
              name={field.name}
              render={({ field: input, fieldState }) => (
                <NumberText
                  {...input}
                  label={field.label}
                  help={field.help}
                  unit={field.kind === "text" ? "" : unitFor(field.kind, units)}
                  isNumber={field.kind !== "text"}
                  error={fieldState.error?.message}
                />
              )}
            />
          ))}
          {rootMessage.length > 0 || issues.length > 0 ? (
            <Notice kind="fault" live title="This cannot be saved yet">
              {rootMessage.map((message) => (
                <Text key={message}>{message}</Text>
              ))}
              {issues.map(({ problem, hint }) => (
                <Text key={problem}>{`${problem} ${hint}`}</Text>
              ))}
            </Notice>
          ) : null}
          {/* Enter in a field saves: a form of several fields needs a submit button for it. */}
          <button type="submit" hidden aria-hidden="true" tabIndex={-1} />
        </View>
      </DomForm>
    </Dialog>
  );
}

/** Findings on what is made of several fields belong to none of them. */
function messagesBeside(errors: Readonly<Record<string, unknown>>, fields: readonly FormField[]): string[] {
  return Object.entries(errors)
    .filter(([name]) => !fields.some((field) => field.name === name))
    .flatMap(([, error]) => {
      const message = (error as { message?: unknown }).message;
      return typeof message === "string" && message !== "" ? [message] : [];
    });
}

const styles = StyleSheet.create({ fields: { gap: space.l } });
