import { AxleSchema, type LengthUnit } from "@linkwright/contract";
import { rightCorner, type Wheel } from "@linkwright/kinematics";
import { useState } from "react";
import { StyleSheet, View } from "react-native";
import { usePose } from "@/features/curves/index.ts";
import { usePreferences } from "@/features/session/index.ts";
import { type EditValue, useStudy } from "@/features/study/index.ts";
import { capitalise } from "@/lib/dialect.ts";
import { space } from "@/ui/theme/tokens.ts";
import { SideBar } from "../components/SideBar.tsx";
import { issuesWith } from "../entry/attempt.ts";
import { drawnSide } from "../entry/rows.ts";
import { labelledValue } from "../form/fieldKinds.ts";
import type { FormField } from "../form/formSchema.ts";
import { PartDialog } from "../form/PartDialog.tsx";
import { EntryRow } from "./EntryRow.tsx";
import { ValueField } from "./ValueField.tsx";

const WheelParts = AxleSchema.shape.left.shape.wheel.shape;

/** Static alignment, and what the wheel and tyre measure. */
export function WheelSection({ units }: { units: LengthUnit }) {
  const { study } = useStudy();
  const side = drawnSide(
    study.axle,
    usePose((pose) => pose.side),
  );
  const corner = side === "left" ? study.axle.left : rightCorner(study.axle);
  const path = ["axle", side, "wheel"];
  return (
    <View style={styles.fields}>
      {study.axle.right === "mirror" ? null : <SideBar />}
      <ValueField
        path={[...path, "toeDeg"]}
        label="Static toe"
        help="Of this wheel; toe-in is positive"
        kind="angle"
        units={units}
      />
      <ValueField
        path={[...path, "camberDeg"]}
        label="Static camber"
        help="Negative: the top leans inboard"
        kind="angle"
        units={units}
      />
      <ValueField
        path={[...path, "loadedRadius"]}
        label="Loaded radius"
        help="From wheel centre to ground under the car's weight"
        kind="length"
        units={units}
      />
      <WheelSet side={side} wheel={corner.wheel} units={units} />
    </View>
  );
}

const RIM: readonly FormField[] = [
  { name: "diameter", label: "Diameter", kind: "length" },
  { name: "width", label: "Width", kind: "length" },
  {
    name: "offset",
    label: "Offset",
    help: "From the rim's middle to its mounting face; positive when the face lies outboard",
    kind: "length",
  },
];
const TYRE: readonly FormField[] = [
  { name: "width", label: "Width", kind: "length" },
  { name: "diameter", label: "Diameter", kind: "length" },
];

interface WheelSetProps {
  readonly side: "left" | "right";
  readonly wheel: Wheel;
  readonly units: LengthUnit;
}

function WheelSet({ side, wheel, units }: WheelSetProps) {
  const { study, mayEdit, changeValue } = useStudy();
  const { words } = usePreferences();
  const [open, setOpen] = useState<"rim" | "tyre" | null>(null);
  const length = (mm: number | undefined) => labelledValue(mm, "length", units);
  const { rim, tyre } = wheel;
  const tyreName = capitalise(words.tyre);
  const change = (part: "rim" | "tyre", to: unknown) => {
    const path = ["axle", side, "wheel", part];
    const issues = issuesWith(study, [{ path, to: to as EditValue }]);
    if (issues.length === 0) changeValue(path, to as EditValue);
    return issues;
  };
  const common = { units, onClose: () => setOpen(null) };
  return (
    <View role="list">
      <EntryRow
        name="Rim"
        details={
          rim ? `⌀ ${length(rim.diameter)} × ${length(rim.width)}, offset ${length(rim.offset)}` : "not given"
        }
        onEdit={mayEdit ? () => setOpen("rim") : undefined}
        onRemove={mayEdit && rim ? () => change("rim", undefined) : undefined}
      />
      <EntryRow
        name={tyreName}
        details={tyre ? `${length(tyre.width)} wide, ⌀ ${length(tyre.diameter)}` : "not given"}
        onEdit={mayEdit ? () => setOpen("tyre") : undefined}
        onRemove={mayEdit && tyre ? () => change("tyre", undefined) : undefined}
      />
      {open === "rim" ? (
        <PartDialog
          {...common}
          title="Rim"
          fields={RIM}
          given={{ ...rim }}
          part={WheelParts.rim.unwrap()}
          onSave={(part) => change("rim", part)}
        />
      ) : null}
      {open === "tyre" ? (
        <PartDialog
          {...common}
          title={tyreName}
          fields={TYRE}
          given={{ ...tyre }}
          part={WheelParts.tyre.unwrap()}
          onSave={(part) => change("tyre", part)}
        />
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({ fields: { gap: space.l } });
