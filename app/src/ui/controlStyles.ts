import { StyleSheet } from "react-native";
import { color, corner, space, touch, type } from "./theme/tokens.ts";

/** What text fields, number fields, selects and text areas share. */
export const control = StyleSheet.create({
  box: {
    minHeight: touch,
    width: "100%",
    boxSizing: "border-box",
    borderWidth: 1,
    borderStyle: "solid",
    borderColor: color.edge,
    borderRadius: corner,
    backgroundColor: color.panel,
    paddingHorizontal: space.m,
    paddingVertical: space.s,
    color: color.ink,
    margin: 0,
  },
  text: { ...type.body },
  invalid: { borderColor: color.fault },
  locked: { backgroundColor: color.hover, borderColor: color.rule, color: color.inkSoft },
});
