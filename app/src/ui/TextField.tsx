import type { ComponentProps, Ref } from "react";
import { StyleSheet } from "react-native";
import { control } from "./controlStyles.ts";
import { DomInput, DomTextArea } from "./dom.tsx";
import { FieldFrame, type FieldFrameProps } from "./FieldFrame.tsx";
import { color, space } from "./theme/tokens.ts";

interface TextFieldProps extends FieldFrameProps {
  readonly value: string;
  readonly onChange: (value: string) => void;
  readonly onBlur?: () => void;
  readonly type?: "text" | "email" | "password" | "url";
  readonly autoComplete?: ComponentProps<"input">["autoComplete"];
  readonly autoFocus?: boolean;
  readonly maxLength?: number;
  readonly disabled?: boolean;
  readonly required?: boolean;
  readonly name?: string;
  readonly ref?: Ref<HTMLInputElement>;
}

export function TextField({
  label,
  help,
  error,
  hideLabel,
  onChange,
  type: kind = "text",
  ref,
  ...input
}: TextFieldProps) {
  return (
    <FieldFrame label={label} help={help} error={error} hideLabel={hideLabel}>
      {({ id, describedBy }) => (
        <DomInput
          {...input}
          ref={ref}
          id={id}
          type={kind}
          aria-describedby={describedBy}
          aria-invalid={error ? true : undefined}
          onChange={(event) => onChange(event.currentTarget.value)}
          style={[
            control.box,
            control.text,
            error ? control.invalid : null,
            input.disabled ? control.locked : null,
          ]}
        />
      )}
    </FieldFrame>
  );
}

interface TextAreaProps extends FieldFrameProps {
  readonly value: string;
  readonly onChange: (value: string) => void;
  readonly onBlur?: () => void;
  readonly rows?: number;
  readonly maxLength?: number;
  readonly ref?: Ref<HTMLTextAreaElement>;
}

export function TextArea({ label, help, error, hideLabel, onChange, rows = 3, ref, ...area }: TextAreaProps) {
  return (
    <FieldFrame label={label} help={help} error={error} hideLabel={hideLabel}>
      {({ id, describedBy }) => (
        <DomTextArea
          {...area}
          ref={ref}
          id={id}
          rows={rows}
          aria-describedby={describedBy}
          aria-invalid={error ? true : undefined}
          onChange={(event) => onChange(event.currentTarget.value)}
          style={[control.box, control.text, styles.area, error ? control.invalid : null]}
        />
      )}
    </FieldFrame>
  );
}

const styles = StyleSheet.create({
  area: { resize: "vertical", paddingVertical: space.m, borderColor: color.edge } as object,
});
