import type { StudyAnswer } from "@linkwright/contract";
import { type Href, usePathname } from "expo-router";
import type { ReactNode } from "react";
import { StyleSheet, View } from "react-native";
import { PersonMenu } from "@/features/frame/index.ts";
import { Heading } from "@/ui/Heading.tsx";
import { BlockLink, Link } from "@/ui/Link.tsx";
import { TabBar } from "@/ui/TabBar.tsx";
import { Text } from "@/ui/Text.tsx";
import { TopBar } from "@/ui/TopBar.tsx";
import { color, space, touch } from "@/ui/theme/tokens.ts";
import { useIsWide } from "@/ui/useMediaQuery.ts";
import { usePageTitle } from "@/ui/usePageTitle.ts";
import { Mark } from "@/ui/Wordmark.tsx";
import { currentScreen, studyTabs } from "../screens.ts";
import { useStudyKeys } from "../useStudyKeys.ts";
import { ConflictDialog } from "./ConflictDialog.tsx";
import { SaveRevisionButton } from "./SaveRevisionButton.tsx";
import { SaveStatus } from "./SaveStatus.tsx";
import { TroubleBar } from "./TroubleBar.tsx";
import { UndoButtons } from "./UndoButtons.tsx";

interface StudyFrameProps {
  readonly study: StudyAnswer;
  readonly buildName: string;
  readonly children: ReactNode;
}

/** Head, tabs and notices round the screen of an open study: tabs at the foot of a phone, in the head when wide. */
export function StudyFrame({ study, buildName, children }: StudyFrameProps) {
  const isWide = useIsWide();
  const screen = currentScreen(usePathname());
  usePageTitle(`${screen.label}, ${study.name}`);
  useStudyKeys();
  const tabs = studyTabs({ buildId: study.buildId, studyId: study.id }, study.openComments);
  const frameProps = { study, buildName, screenLabel: screen.label };
  return (
    <View style={isWide ? styles.wideFrame : styles.frame}>
      {isWide ? (
        <WideHead
          {...frameProps}
          tabs={<TabBar label="Study" tabs={tabs} currentKey={screen.key} place="head" />}
        />
      ) : (
        <PhoneHead {...frameProps} />
      )}
      <View role="main" nativeID="content" style={isWide ? styles.wideMain : styles.main}>
        {isWide ? (
          <Heading level={1} style={styles.hidden}>
            {`${screen.label}, ${study.name}`}
          </Heading>
        ) : null}
        <TroubleBar />
        {children}
      </View>
      {isWide ? null : <TabBar label="Study" tabs={tabs} currentKey={screen.key} place="foot" />}
      <ConflictDialog />
    </View>
  );
}

interface HeadProps extends Omit<StudyFrameProps, "children"> {
  readonly screenLabel: string;
}

function WideHead({ study, buildName, tabs }: HeadProps & { tabs: ReactNode }) {
  return (
    <TopBar
      start={
        <>
          <HomeLink href="/builds" label="Linkwright, to the builds" />
          <Text numberOfLines={1} style={styles.crumbs}>
            <Link href={{ pathname: "/builds/[buildId]", params: { buildId: study.buildId } }} tone="inkSoft">
              {buildName}
            </Link>
            <Text tone="inkSoft">{"  /  "}</Text>
            <Text variant="strong">{study.name}</Text>
          </Text>
        </>
      }
      middle={tabs}
      end={
        <>
          <SaveStatus study={study} />
          <UndoButtons />
          <SaveRevisionButton />
          <PersonMenu />
        </>
      }
    />
  );
}

function PhoneHead({ study, buildName, screenLabel }: HeadProps) {
  return (
    <>
      <TopBar
        start={
          <>
            <HomeLink
              href={{ pathname: "/builds/[buildId]", params: { buildId: study.buildId } }}
              label={`Linkwright, back to ${buildName}`}
            />
            <View style={styles.phoneTitles}>
              <Text variant="label" tone="inkSoft" numberOfLines={1}>
                {`${buildName} · ${study.name}`}
              </Text>
              <Heading level={1} variant="section">
                {screenLabel}
              </Heading>
            </View>
          </>
        }
        end={<PersonMenu />}
      />
      <View style={styles.strip}>
        <SaveStatus study={study} />
        <View style={styles.stripActions}>
          <UndoButtons />
          <SaveRevisionButton compact />
        </View>
      </View>
    </>
  );
}

function HomeLink({ href, label }: { href: Href; label: string }) {
  return (
    <BlockLink href={href} className="row-link" label={label} style={styles.home}>
      <Mark />
    </BlockLink>
  );
}

/** The foot bar's height with room below it, so that the last line of a screen can be scrolled clear of it. */
const FOOT_ROOM = 84;

const styles = StyleSheet.create({
  frame: { flexGrow: 1, flexShrink: 0 },
  wideFrame: { height: "100dvh" as never },
  main: { flexGrow: 1, paddingBottom: FOOT_ROOM },
  wideMain: { flex: 1, minHeight: 0, overflowY: "auto" } as object,
  hidden: { position: "absolute", width: 1, height: 1, overflow: "hidden", clipPath: "inset(50%)" } as object,
  home: { width: touch, height: touch, marginLeft: -10, alignItems: "center", justifyContent: "center" },
  crumbs: { flexShrink: 1, maxWidth: 320 },
  phoneTitles: { flexShrink: 1, minWidth: 0, paddingVertical: space.xs },
  strip: {
    flexDirection: "row",
    alignItems: "center",
    justifyContent: "space-between",
    gap: space.s,
    minHeight: 48,
    paddingHorizontal: space.l,
    backgroundColor: color.panel,
    borderBottomWidth: 1,
    borderBottomColor: color.rule,
  },
  stripActions: { flexDirection: "row", alignItems: "center" },
});
