import { Text } from "react-native";
import { color, type } from "@/ui/theme/tokens.ts";

export default function HomeRoute() {
  return <Text style={[type.display, { color: color.dye }]}>Linkwright</Text>;
}
