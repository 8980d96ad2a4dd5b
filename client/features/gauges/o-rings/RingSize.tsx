import type { ComponentProps } from "react";
import { Size } from "../../../ui/Size";

const toHundredth = (mm: number) => Math.round(mm * 100) / 100;

/** A size of the standard, which is exact in thousandths of an inch, to a hundredth of a millimetre. */
export function RingSize({ mm, plusMinusMm, ...rest }: ComponentProps<typeof Size>) {
  return (
    <Size
      mm={toHundredth(mm)}
      plusMinusMm={plusMinusMm === undefined ? undefined : toHundredth(plusMinusMm)}
      {...rest}
    />
  );
}
