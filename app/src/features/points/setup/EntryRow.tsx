import { StyleSheet, View } from "react-native";
import { Button } from "@/ui/Button.tsx";
import { Figure, Text } from "@/ui/Text.tsx";
import { color, space } from "@/ui/theme/tokens.ts";

interface EntryRowProps {
  readonly name: string;
  readonly details: string;
  readonly onEdit?: (() => void) | undefined;
  readonly onRemove?: (() => void) | undefined;
}

/** One entry of a list, with the ways to change it or to take it away. */
export function EntryRow({ name, details, onEdit, onRemove }: EntryRowProps) {
  return (
    <View role="listitem" style={styles.row}>
      <View style={styles.words}>
        <Text variant="strong">{name}</Text>
        <Figure variant="figureSmall" tone="inkSoft">
          {details}
        </Figure>
      </View>
      {onEdit ? <Button label="Edit" accessibleLabel={`Edit ${name}`} onPress={onEdit} /> : null}
      {onRemove ? (
        <Button kind="quiet" label="Remove" accessibleLabel={`Remove ${name}`} onPress={onRemove} />
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  row: {
    flexDirection: "row",
    flexWrap: "wrap",
    alignItems: "center",
    gap: space.s,
    paddingVertical: space.s,
    borderTopWidth: 1,
    borderTopColor: color.rule,
  },
  words: { flexGrow: 1, flexBasis: 160, minWidth: 0 },
});
