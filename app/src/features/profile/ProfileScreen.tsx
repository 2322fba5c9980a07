import type { ChangeMeRequest } from "@linkwright/contract";
import { StyleSheet, View } from "react-native";
import { useChangeMe } from "@/api/auth.ts";
import { ShopFrame } from "@/features/frame/index.ts";
import { useCurrentPerson, usePreferences } from "@/features/session/index.ts";
import { capitalise, DIALECT_WORDS, type DialectWord } from "@/lib/dialect.ts";
import { Choice } from "@/ui/Choice.tsx";
import { ErrorState } from "@/ui/ErrorState.tsx";
import { Page } from "@/ui/Page.tsx";
import { Panel } from "@/ui/Panel.tsx";
import { Text } from "@/ui/Text.tsx";
import { useTheme } from "@/ui/theme/ThemeProvider.tsx";
import { space } from "@/ui/theme/tokens.ts";
import { NameForm } from "./NameForm.tsx";

const UNITS = [
  { value: "mm", label: "Millimetres" },
  { value: "inch", label: "Inches" },
] as const;
const DIALECTS = [
  { value: "uk", label: "UK" },
  { value: "us", label: "US" },
] as const;
const THEMES = [
  { value: "system", label: "System" },
  { value: "light", label: "Light" },
  { value: "dark", label: "Dark" },
] as const;

export function ProfileScreen() {
  const me = useCurrentPerson();
  const { words } = usePreferences();
  const change = useChangeMe();
  const { chooseTheme } = useTheme();
  const keep = (request: ChangeMeRequest) => change.mutate(request);
  return (
    <ShopFrame>
      <Page title="Your profile" intro={me.email} width="reading">
        {change.error ? (
          <ErrorState
            title="The change was not kept"
            error={change.error}
            onRetry={() => change.variables && keep(change.variables)}
          />
        ) : null}
        <Panel title="Name">
          <NameForm name={me.name} onSave={(name) => change.mutateAsync({ name })} />
        </Panel>
        <Panel title="How things are shown">
          <View style={styles.choice}>
            <Choice
              label="Lengths"
              value={me.preferences.units}
              options={UNITS}
              onChange={(units) => keep({ units })}
            />
            <Text variant="small" tone="inkSoft">
              For display and entry. Documents are kept in millimetres either way.
            </Text>
          </View>
          <View style={styles.choice}>
            <Choice
              label="Words of the trade"
              value={me.preferences.dialect}
              options={DIALECTS}
              onChange={(dialect) => keep({ dialect })}
            />
            <Text variant="small" tone="inkSoft">
              {sampleOf(words)}
            </Text>
          </View>
          <Choice
            label="Theme"
            value={me.preferences.theme}
            options={THEMES}
            onChange={(theme) => {
              chooseTheme(theme);
              keep({ theme });
            }}
          />
        </Panel>
      </Page>
    </ShopFrame>
  );
}

const SAMPLE_WORDS = Object.keys(DIALECT_WORDS.uk) as DialectWord[];

function sampleOf(words: Readonly<Record<DialectWord, string>>): string {
  return `${capitalise(SAMPLE_WORDS.map((word) => words[word]).join(", "))}.`;
}

const styles = StyleSheet.create({ choice: { gap: space.xs } });
