import { Text, type TextProps } from "./Text.tsx";
import type { TypeName } from "./theme/tokens.ts";

type Level = 1 | 2 | 3 | 4;

const VARIANT_OF_LEVEL: Record<Level, TypeName> = { 1: "title", 2: "section", 3: "block", 4: "label" };

interface HeadingProps extends TextProps {
  /** The place in the page's outline; the looks may be chosen apart from it. */
  readonly level: Level;
}

export function Heading({ level, variant = VARIANT_OF_LEVEL[level], ...rest }: HeadingProps) {
  return <Text role="heading" aria-level={level} variant={variant} {...rest} />;
}
