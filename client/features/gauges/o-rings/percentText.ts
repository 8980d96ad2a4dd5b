import { roundDecimal } from "#shared/domain/roundDecimal";

/** A percentage to one decimal with a true minus: "−21.0". */
export const percentText = (percent: number): string => roundDecimal(percent, 1).replace("-", "\u2212");
