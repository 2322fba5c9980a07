import { Text as NativeText, type TextProps as NativeTextProps } from "react-native";
import { type ColorName, color, type TypeName, type } from "./theme/tokens.ts";

export interface TextProps extends NativeTextProps {
  readonly variant?: TypeName;
  readonly tone?: ColorName;
}

export function Text({ variant = "body", tone = "ink", style, ...rest }: TextProps) {
  return <NativeText {...rest} style={[type[variant], { color: color[tone] }, style]} />;
}

/** A number, always in tabular figures. */
export function Figure({ variant = "figure", ...rest }: TextProps) {
  return <Text variant={variant} {...rest} />;
}
