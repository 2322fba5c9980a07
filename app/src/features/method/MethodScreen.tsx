import { StyleSheet, View } from "react-native";
import { CautionList } from "@/features/cautions/index.ts";
import { usePreferences } from "@/features/session/index.ts";
import { Heading } from "@/ui/Heading.tsx";
import { Page } from "@/ui/Page.tsx";
import { Text } from "@/ui/Text.tsx";
import { color, space } from "@/ui/theme/tokens.ts";
import { useIsMedium } from "@/ui/useMediaQuery.ts";
import { type Definition, type DefinitionGroup, definitionsIn } from "./definitions.ts";

export function MethodScreen() {
  const { words } = usePreferences();
  return (
    <Page
      title="Method and cautions"
      intro="How every number here comes about, what its sign says, and where its definition comes from."
      width="reading"
    >
      <View style={styles.section}>
        <Heading level={2}>Cautions</Heading>
        <CautionList />
      </View>
      <View style={styles.section}>
        <Heading level={2}>How it is solved</Heading>
        <Text>
          Every link is a fixed distance between a point of the body and a point of the knuckle. The knuckle
          has six freedoms; the links take five and the wheel's height is the sixth. They are solved together
          until no link is off its length by more than a ten-millionth of a millimetre, step by step from the
          design position, so that the linkage never jumps to its other assembly. Gradients come from the same
          equations, not from differences. Where a position cannot be reached the curve ends there, and the
          link that ran out is named.
        </Text>
        <Text>
          Starting targets for bump steer, per wheel, are common practice and yours to change: ±0.15° over ±50
          mm for the street, ±0.05° over ±40 mm after shimming for track and hill climb.
        </Text>
      </View>
      {definitionsIn(words).map((group) => (
        <Group key={group.title} group={group} />
      ))}
    </Page>
  );
}

function Group({ group }: { group: DefinitionGroup }) {
  return (
    <View style={styles.section}>
      <Heading level={2}>{group.title}</Heading>
      <View style={styles.list}>
        {group.definitions.map((definition) => (
          <Entry key={definition.name} definition={definition} />
        ))}
      </View>
    </View>
  );
}

function Entry({ definition }: { definition: Definition }) {
  const isMedium = useIsMedium();
  const { name, meaning, positive, source } = definition;
  return (
    <View style={[styles.entry, isMedium && styles.entryWide]}>
      <Heading level={3} style={isMedium ? styles.name : null}>
        {name}
      </Heading>
      <View style={styles.words}>
        <Text>{meaning}</Text>
        {positive ? (
          <Text variant="small">
            <Text variant="small" style={styles.lead}>
              {"Positive "}
            </Text>
            {positive}.
          </Text>
        ) : null}
        <Text variant="small" tone="inkSoft">
          {`Source: ${source}.`}
        </Text>
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  section: { gap: space.m },
  list: { borderTopWidth: 1, borderTopColor: color.rule },
  entry: { paddingVertical: space.l, gap: space.xs, borderBottomWidth: 1, borderBottomColor: color.rule },
  entryWide: { flexDirection: "row", gap: space.xl },
  name: { width: 190, flexShrink: 0 },
  words: { flex: 1, gap: space.xs },
  lead: { fontWeight: "600" },
});
