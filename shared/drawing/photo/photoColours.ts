import type { PartKind } from "#shared/domain/partKinds";
import { materialLook } from "../materialLook";

export const metalColours = ["#c9a24e", "#b9bcc0", "#bf8d4a", "#a9adb2"] as const;
const feltColours = ["#7d8a6a", "#a8433a", "#cfc6b0", "#3f6b5c"] as const;
const rubberColours = ["#2c2d30", "#333130", "#26282b", "#35373a"] as const;

/** The body colour of a part: by its material, with a little variety by look. */
export function bodyColour(kind: PartKind, material: string | undefined, look: number): string {
  const drawn = materialLook(kind, material);
  if (drawn === "felt") return feltColours[look % feltColours.length]!;
  if (drawn === "cork") return "#b98a56";
  const name = material?.toLowerCase() ?? "";
  if (name.includes("silicone")) return "#8c5a4c";
  if (name.includes("polyurethane")) return "#9b7433";
  if (name.includes("natural")) return "#5b4632";
  return rubberColours[look % rubberColours.length]!;
}
