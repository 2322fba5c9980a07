import type { LengthUnit } from "@linkwright/contract";
import { CarSection } from "./CarSection.tsx";
import { HeightsSection } from "./HeightsSection.tsx";
import { SteeringSection } from "./SteeringSection.tsx";
import type { SectionId } from "./sections.ts";
import { TargetsSection } from "./TargetsSection.tsx";
import { WheelSection } from "./WheelSection.tsx";

export function SetupSection({ id, units }: { id: SectionId; units: LengthUnit }) {
  switch (id) {
    case "wheel":
      return <WheelSection units={units} />;
    case "steering":
      return <SteeringSection units={units} />;
    case "heights":
      return <HeightsSection units={units} />;
    case "targets":
      return <TargetsSection units={units} />;
    case "body":
      return <CarSection units={units} />;
  }
}
