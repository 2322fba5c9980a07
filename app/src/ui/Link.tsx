import { type Href, Link as RouterLink } from "expo-router";
import type { ReactNode } from "react";
import { Pressable, type StyleProp, StyleSheet, type ViewStyle } from "react-native";
import type { ButtonKind } from "./Button.tsx";
import { cssClass } from "./dom.tsx";
import { Text } from "./Text.tsx";
import { type ColorName, color, corner, space, type TypeName, touch, type } from "./theme/tokens.ts";

interface LinkProps {
  readonly href: Href;
  readonly children: ReactNode;
  readonly variant?: TypeName;
  readonly tone?: ColorName;
}

/** A link within or after text. */
export function Link({ href, children, variant = "body", tone = "dye" }: LinkProps) {
  return (
    <RouterLink href={href} style={[type[variant], styles.inline, { color: color[tone] }]}>
      {children}
    </RouterLink>
  );
}

interface BlockLinkProps {
  readonly href: Href;
  readonly children: ReactNode;
  readonly label?: string;
  readonly style?: StyleProp<ViewStyle>;
  readonly className?: string;
  readonly isCurrent?: boolean;
}

/** A whole block that leads somewhere; its accessible name is its text unless `label` is given. */
export function BlockLink({
  href,
  children,
  label,
  style,
  className = "block-link",
  isCurrent,
}: BlockLinkProps) {
  const current = isCurrent ? { "aria-current": "page" as const } : {};
  return (
    <RouterLink href={href} asChild>
      <Pressable aria-label={label} style={[cssClass(className), style]} {...current}>
        {children}
      </Pressable>
    </RouterLink>
  );
}

export function LinkButton({
  href,
  label,
  kind = "secondary",
  grow,
}: {
  href: Href;
  label: string;
  kind?: ButtonKind;
  grow?: boolean;
}) {
  const isPrimary = kind === "primary";
  return (
    <BlockLink
      href={href}
      className={`button button-${kind}`}
      style={[
        styles.button,
        isPrimary ? styles.primary : styles[kind === "quiet" ? "quiet" : "secondary"],
        grow && styles.grow,
      ]}
    >
      <Text
        variant="strong"
        tone={isPrimary ? "onDye" : kind === "quiet" ? "dye" : "ink"}
        style={styles.centred}
      >
        {label}
      </Text>
    </BlockLink>
  );
}

const styles = StyleSheet.create({
  inline: { textDecorationLine: "underline", textUnderlineOffset: 3 } as object,
  button: {
    minHeight: touch,
    paddingHorizontal: space.l,
    paddingVertical: space.s,
    alignItems: "center",
    justifyContent: "center",
    borderWidth: 1,
    borderRadius: corner,
  },
  primary: { backgroundColor: color.dye, borderColor: color.dye },
  secondary: { backgroundColor: color.panel, borderColor: color.ink },
  quiet: { backgroundColor: "transparent", borderColor: "transparent" },
  grow: { flex: 1 },
  centred: { textAlign: "center" },
});
