// DOM elements that take the same style arrays as React Native's views, for what React Native has no word for:
// labels tied to inputs, submit buttons, native selects, tables and dialogs. Web only, as the app is.

import type { ComponentProps, JSX } from "react";
import type { StyleProp, TextStyle, ViewStyle } from "react-native";
import { unstable_createElement } from "react-native-web";

type AnyStyle = StyleProp<ViewStyle> | StyleProp<TextStyle>;

type DomProps<Tag extends keyof JSX.IntrinsicElements> = Omit<ComponentProps<Tag>, "style"> & {
  style?: AnyStyle;
};

/**
 * A class of our stylesheet as a style. React Native for Web drops `className`; an object marked `$$css` is its own
 * way in, handed through untouched, so the cast claims no property that it lacks: it has none.
 */
export function cssClass(name: string): ViewStyle & TextStyle {
  return { $$css: true, [name]: name } as unknown as ViewStyle & TextStyle;
}

function withClass({ className, style, ...rest }: { className?: string | undefined; style?: AnyStyle }) {
  return { ...rest, style: className ? [cssClass(className), style] : style };
}

export function DomButton(props: DomProps<"button">) {
  return unstable_createElement("button", { type: "button", ...withClass(props) });
}

/** Our own messages stand in for the browser's, so its validation is off. */
export function DomForm(props: DomProps<"form">) {
  return unstable_createElement("form", { noValidate: true, ...withClass(props) });
}

export function DomInput(props: DomProps<"input">) {
  return unstable_createElement("input", withClass(props));
}

export function DomTextArea(props: DomProps<"textarea">) {
  return unstable_createElement("textarea", withClass(props));
}

export function DomSelect(props: DomProps<"select">) {
  return unstable_createElement("select", withClass(props));
}

export function DomLabel(props: DomProps<"label">) {
  return unstable_createElement("label", withClass(props));
}

export function DomDialog(props: DomProps<"dialog">) {
  return unstable_createElement("dialog", withClass(props));
}

export function DomDiv(props: DomProps<"div">) {
  return unstable_createElement("div", withClass(props));
}

export function DomTable(props: DomProps<"table">) {
  return unstable_createElement("table", withClass(props));
}

export function DomTableHead(props: DomProps<"thead">) {
  return unstable_createElement("thead", withClass(props));
}

export function DomTableBody(props: DomProps<"tbody">) {
  return unstable_createElement("tbody", withClass(props));
}

export function DomTableRow(props: DomProps<"tr">) {
  return unstable_createElement("tr", withClass(props));
}

export function DomTableHeadCell(props: DomProps<"th">) {
  return unstable_createElement("th", withClass(props));
}

export function DomTableCell(props: DomProps<"td">) {
  return unstable_createElement("td", withClass(props));
}

export function DomAnchor(props: DomProps<"a">) {
  return unstable_createElement("a", withClass(props));
}
