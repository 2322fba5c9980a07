import type { ComponentProps, Ref } from "react";
import { Text as NativeText } from "react-native";
import { type ColorName, color, type TypeName, type } from "./theme/tokens.ts";

export interface TextProps extends ComponentProps<typeof NativeText> {
  readonly variant?: TypeName;
  readonly tone?: ColorName;
  readonly ref?: Ref<NativeText>;
}

export function Text({ variant = "body", tone = "ink", style, ...rest }: TextProps) {
  return <NativeText {...rest} style={[type[variant], { color: color[tone] }, style]} />;
}

/** A number, always in tabular figures. */
export function Figure({ variant = "figure", ...rest }: TextProps) {
  return <Text variant={variant} {...rest} />;
}
