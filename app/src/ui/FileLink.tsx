import { StyleSheet } from "react-native";
import { DomAnchor } from "./dom.tsx";
import { Text } from "./Text.tsx";
import { color, corner, space, touch } from "./theme/tokens.ts";

interface FileLinkProps {
  readonly url: string;
  readonly label: string;
  readonly accessibleLabel?: string;
  readonly fileName?: string | undefined;
}

/** Fetches a file by the browser's own means, so that it lands where downloads do. */
export function FileLink({ url, label, accessibleLabel, fileName }: FileLinkProps) {
  return (
    <DomAnchor
      href={url}
      download={fileName ?? true}
      aria-label={accessibleLabel}
      className="button button-secondary"
      style={styles.link}
    >
      <Text variant="strong">{label}</Text>
    </DomAnchor>
  );
}

const styles = StyleSheet.create({
  link: {
    minHeight: touch,
    paddingHorizontal: space.l,
    display: "flex",
    flexDirection: "row",
    alignItems: "center",
    borderWidth: 1,
    borderStyle: "solid",
    borderColor: color.ink,
    borderRadius: corner,
    backgroundColor: color.panel,
    textDecorationLine: "none",
    boxSizing: "border-box",
  } as object,
});
