import { usePathname } from "expo-router";
import { View } from "react-native";
import { LinkButton } from "@/ui/Link.tsx";
import { Page } from "@/ui/Page.tsx";
import { Text } from "@/ui/Text.tsx";
import { space } from "@/ui/theme/tokens.ts";
import { PublicFrame } from "./PublicFrame.tsx";

export function NotFoundScreen() {
  const path = usePathname();
  return (
    <PublicFrame>
      <Page title="There is nothing at this address" width="reading">
        <Text>
          <Text variant="figure">{path}</Text>
          {
            " leads nowhere. The link may be old or mistyped, or what stood here belongs to a workshop you are not in."
          }
        </Text>
        <View style={{ flexDirection: "row", flexWrap: "wrap", gap: space.m }}>
          <LinkButton href="/builds" kind="primary" label="Go to the builds" />
          <LinkButton href="/" label="Start page" />
        </View>
      </Page>
    </PublicFrame>
  );
}
