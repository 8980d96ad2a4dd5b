import type { Contact } from "#shared/domain/beltTangents";
import type { NamedPulley } from "./beltState";
import { freeSideOf, hasOwnNumber } from "./boardLabels";
import { toPx, type View } from "./boardView";
import { PulleyMark } from "./PulleyMark";

type Props = {
  pulley: NamedPulley;
  index: number;
  /** How the belt lies on it, while there is a belt. */
  contact: Contact | undefined;
  isRefused: boolean;
  thickness: number;
  view: View;
};

/** A pulley at its place on the board. */
export function PlacedPulley({ pulley, index, contact, isRefused, thickness, view }: Props) {
  return (
    <PulleyMark
      number={index + 1}
      {...toPx(view, pulley)}
      radius={(pulley.diameter / 2) * view.scale}
      freeSide={contact ? freeSideOf(contact) : null}
      turn={contact?.turn ?? 1}
      beltPx={Math.max(thickness * view.scale, 2)}
      hasNumber={hasOwnNumber(pulley, view)}
      isRefused={isRefused}
    />
  );
}
