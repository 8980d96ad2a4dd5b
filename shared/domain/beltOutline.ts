import type { Contact } from "./beltTangents";

/** The middle line of a belt as the `d` of an SVG path, in the coordinates that its circles have (mm). */
export function beltOutline(contacts: readonly Contact[]): string {
  const pieces = contacts.map(({ arrive, leave, radius, wrap, turn }, i) => {
    const arc = `A${radius} ${radius} 0 ${wrap > Math.PI ? 1 : 0} ${turn > 0 ? 1 : 0} ${leave.x} ${leave.y}`;
    return `${i === 0 ? "M" : "L"}${arrive.x} ${arrive.y}${wrap > 0 ? arc : ""}`;
  });
  return `${pieces.join("")}Z`;
}
