import { Redirect, useLocalSearchParams } from "expo-router";

export default function StudyRoute() {
  const params = useLocalSearchParams<{ buildId: string; studyId: string }>();
  return <Redirect href={{ pathname: "/builds/[buildId]/studies/[studyId]/points", params }} />;
}
