import { Sign } from "@/ui/Sign.tsx";
import { color } from "@/ui/theme/tokens.ts";
import type { FaultReport } from "./reports.ts";

/** On the red strip the octagon is filled, so that it reads as a stop sign even without colour. */
export function FaultSign({ severity }: { severity: FaultReport["severity"] }) {
  if (severity === "amber") return <Sign kind="amber" size={22} />;
  return (
    <svg aria-hidden="true" width="26" height="26" viewBox="0 0 18 18" style={{ flexShrink: 0 }}>
      <path d="M5.8 1.5h6.4l4.3 4.3v6.4l-4.3 4.3H5.8l-4.3-4.3V5.8Z" fill={color.onFault} />
      <path d="M9 4.6v5.2M9 11.6v1.8" stroke={color.fault} strokeWidth="1.9" />
    </svg>
  );
}
