import { type Href, Link as RouterLink, useRouter } from "expo-router";
import type { MouseEvent, ReactNode } from "react";
import { type StyleProp, StyleSheet, type ViewStyle } from "react-native";
import type { ButtonKind } from "./Button.tsx";
import { DomAnchor } from "./dom.tsx";
import { Text } from "./Text.tsx";
import { type ColorName, color, corner, space, type TypeName, touch, type } from "./theme/tokens.ts";

interface LinkProps {
  readonly href: Href;
  readonly children: ReactNode;
  /** Not within a sentence: then it is as high as a thumb needs. */
  readonly standalone?: boolean;
  readonly variant?: TypeName;
  readonly tone?: ColorName;
}

/** A link within or after text. */
export function Link({ href, children, standalone, variant = "body", tone = "dye" }: LinkProps) {
  return (
    <RouterLink
      href={href}
      style={[type[variant], styles.inline, standalone && styles.standalone, { color: color[tone] }]}
    >
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

function isPlainClick(event: MouseEvent): boolean {
  return event.button === 0 && !(event.metaKey || event.ctrlKey || event.shiftKey || event.altKey);
}

/**
 * A whole block that leads somewhere; its accessible name is its text unless `label` is given. An anchor of our own,
 * because the router's link is a text and its `asChild` spreads style arrays into objects.
 */
export function BlockLink({
  href,
  children,
  label,
  style,
  className = "block-link",
  isCurrent,
}: BlockLinkProps) {
  const router = useRouter();
  return (
    <DomAnchor
      href={RouterLink.resolveHref(href)}
      aria-label={label}
      aria-current={isCurrent ? "page" : undefined}
      className={className}
      onClick={(event) => {
        if (event.defaultPrevented || !isPlainClick(event)) return;
        event.preventDefault();
        router.navigate(href);
      }}
      style={[styles.block, style]}
    >
      {children}
    </DomAnchor>
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
  standalone: {
    display: "inline-flex",
    alignItems: "center",
    minHeight: touch,
    alignSelf: "flex-start",
  } as object,
  // What a View is by default.
  block: {
    display: "flex",
    flexDirection: "column",
    boxSizing: "border-box",
    minWidth: 0,
    borderWidth: 0,
    borderStyle: "solid",
    textDecorationLine: "none",
    cursor: "pointer",
  } as object,
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
