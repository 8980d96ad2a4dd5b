import type { PartKind } from "#shared/domain/partKinds";
import type { MaterialLook } from "./Scene";

/**
 * Which of the drawn materials a part is made of.
 *
 * Shape: the name of a material as a listing states it, in any case ("NBR", "wool felt", "cork"); where none is stated, pads
 *        and clutch felts are felt and everything else is rubber. Rubbers, silicone and polyurethane look alike here.
 */
export function materialLook(kind: PartKind, material?: string): MaterialLook {
  const name = material?.toLowerCase() ?? "";
  if (name.includes("felt")) return "felt";
  if (name.includes("cork")) return "cork";
  if (name === "" && (kind === "brake-pad" || kind === "clutch-felt")) return "felt";
  return "rubber";
}
