import type { Role } from "@linkwright/contract";
import { useRouter } from "expo-router";
import { StyleSheet, View } from "react-native";
import { useSignOut } from "@/api/auth.ts";
import { useCurrentPerson, useWorkshop } from "@/features/session/index.ts";
import { DomButton } from "@/ui/dom.tsx";
import { BlockLink } from "@/ui/Link.tsx";
import { Menu } from "@/ui/Menu.tsx";
import { Text } from "@/ui/Text.tsx";
import { color, space, touch, type } from "@/ui/theme/tokens.ts";

const ROLE_NAME: Record<Role, string> = {
  owner: "Owner",
  engineer: "Engineer",
  fabricator: "Fabricator",
  reviewer: "Reviewer",
};

function initialsOf(name: string): string {
  const words = name.split(/\s+/).filter(Boolean);
  const letters = words.length > 1 ? [words[0], words[words.length - 1]] : words;
  return letters.map((word) => word?.charAt(0).toUpperCase() ?? "").join("");
}

export function PersonMenu() {
  const me = useCurrentPerson();
  const { workshopId, workshopName, role, choose } = useWorkshop();
  const router = useRouter();
  const signOut = useSignOut();
  const leave = async () => {
    await signOut.mutateAsync();
    router.replace("/");
  };
  return (
    <Menu label={`${me.name}: menu`} button={<Initials name={me.name} />}>
      <View style={styles.who}>
        <Text variant="strong">{me.name}</Text>
        <Text variant="small" tone="inkSoft">{`${ROLE_NAME[role]} in ${workshopName}`}</Text>
      </View>
      {me.memberships
        .filter((membership) => membership.workshopId !== workshopId)
        .map((membership) => (
          <MenuButton
            key={membership.workshopId}
            label={`Go to ${membership.workshopName}`}
            onPress={() => {
              choose(membership.workshopId);
              router.navigate("/builds");
            }}
          />
        ))}
      <MenuLink href="/builds" label="Builds" />
      <MenuLink href="/profile" label="Your profile" />
      <MenuLink href="/method" label="Method and cautions" />
      <MenuButton label="Sign out" onPress={leave} />
    </Menu>
  );
}

function Initials({ name }: { name: string }) {
  return (
    <View style={styles.initials}>
      <Text variant="label" tone="dye" style={styles.letters}>
        {initialsOf(name)}
      </Text>
    </View>
  );
}

function MenuLink({ href, label }: { href: "/builds" | "/profile" | "/method"; label: string }) {
  return (
    <BlockLink href={href} className="row-link" style={styles.item}>
      <Text>{label}</Text>
    </BlockLink>
  );
}

function MenuButton({ label, onPress }: { label: string; onPress: () => unknown }) {
  return (
    <DomButton className="row-link" onClick={onPress} style={[type.body, styles.item, styles.button]}>
      {label}
    </DomButton>
  );
}

const styles = StyleSheet.create({
  who: { padding: space.l, borderBottomWidth: 1, borderBottomColor: color.rule, marginBottom: space.xs },
  initials: {
    width: 34,
    height: 34,
    borderRadius: 17,
    borderWidth: 1.5,
    borderColor: color.dye,
    alignItems: "center",
    justifyContent: "center",
  },
  letters: { fontWeight: "600" },
  item: { minHeight: touch, paddingHorizontal: space.l, justifyContent: "center" },
  button: {
    borderWidth: 0,
    backgroundColor: "transparent",
    color: color.ink,
    textAlign: "left",
    width: "100%",
    cursor: "pointer",
  },
});
