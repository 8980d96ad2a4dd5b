import { type AcceptedBand, defaultBand } from "#shared/domain/acceptedBands";
import type { Condition } from "#shared/domain/conditions";
import type { Instrument } from "#shared/domain/instruments";
import { formatLength } from "#shared/domain/length";
import { type DimensionName, dimensionWords, type PartKind } from "#shared/domain/partKinds";
import { sizeAsNew } from "#shared/domain/sizeAsNew";
import type { WrittenSize } from "#shared/domain/writtenSize";
import type { NeedDimension } from "#shared/schemas/need";
import type { RegisterSize } from "./familyRegister";

/** A size as it was written, and what was understood. */
export type WrittenDimension = { dimension: DimensionName; text: string; size: WrittenSize };

/** Whose register is used, for the words. */
export type RegisterOf = { pointName: string; familyName: string };

const span = ({ lowerMm, upperMm }: AcceptedBand) =>
  `${formatLength(lowerMm, "mm").replace(" mm", "")} to ${formatLength(upperMm, "mm")}`;
const accepts = (band: AcceptedBand, { pointName, familyName }: RegisterOf) =>
  `The ${pointName} of the ${familyName} accepts ${span(band)} (register).`;
const usual = (band: AcceptedBand) => `Taken as accepted: ${span(band)} (common practice, no source).`;

/**
 * Whether a measured size speaks against a service point: it lies outside the band by more than three standard
 * uncertainties and the width of the band together. Worn parts lie outside often, but not that far.
 */
export function contradicts({ asNewMm, standardUncertaintyMm }: NeedDimension, { lowerMm, upperMm }: RegisterSize) {
  const outside = Math.max(lowerMm - asNewMm, asNewMm - upperMm, 0);
  return outside > 3 * standardUncertaintyMm + (upperMm - lowerMm);
}

/** A size that was measured or worked out, as new, with the usual band around it. Errors: DomainError as `sizeAsNew`. */
export function writtenDimension(
  kind: PartKind,
  { dimension, text, size }: WrittenDimension,
  { instrument, condition }: { instrument: Instrument; condition: Condition },
): NeedDimension {
  const { asFoundMm, asNew, basis } = sizeAsNew(size, { kind, dimension, instrument, condition });
  const band = defaultBand(kind, dimension, asNew.valueMm);
  return {
    dimension,
    text,
    echo: size.echo,
    asFoundMm,
    asNewMm: asNew.valueMm,
    standardUncertaintyMm: asNew.standardUncertaintyMm,
    ...band,
    bandFrom: "common-practice",
    basis: [...basis, usual(band)],
  };
}

/** The same size, judged by the band of a service point. */
export function inBandOf(size: NeedDimension, { lowerMm, upperMm }: RegisterSize, of: RegisterOf): NeedDimension {
  const basis = [...size.basis.slice(0, -1), accepts({ lowerMm, upperMm }, of)];
  return { ...size, lowerMm, upperMm, bandFrom: "service-point", basis };
}

/** The same size with a word of warning: the register says something else, so its band is not used. */
export function againstRegister(size: NeedDimension, register: RegisterSize, of: RegisterOf): NeedDimension {
  const words = `This is far from the ${formatLength(register.nominalMm, "mm")} that the ${of.pointName} of the ${of.familyName} takes, so its band is not used: check the family.`;
  return { ...size, basis: [...size.basis, words] };
}

/**
 * A size that was not measured but is in the register. Its uncertainty is 0: the band alone says what will do, and what is
 * uncertain is left to the part.
 */
export function registerDimension(dimension: DimensionName, size: RegisterSize, of: RegisterOf): NeedDimension {
  const { nominalMm, lowerMm, upperMm } = size;
  const shown = formatLength(nominalMm, "mm");
  return {
    dimension,
    text: null,
    echo: shown,
    asFoundMm: null,
    asNewMm: nominalMm,
    standardUncertaintyMm: 0,
    lowerMm,
    upperMm,
    bandFrom: "service-point",
    basis: [
      `Not measured: the ${of.pointName} of the ${of.familyName} takes a ${dimensionWords[dimension]} of ${shown} (register).`,
      accepts(size, of),
    ],
  };
}

/** The size moved by hand to another as-new value: its uncertainty stays, its band moves along. */
export function movedDimension(kind: PartKind, size: NeedDimension, toMm: number): NeedDimension {
  const by = toMm - size.asNewMm;
  const band =
    size.bandFrom === "service-point"
      ? { lowerMm: size.lowerMm + by, upperMm: size.upperMm + by }
      : defaultBand(kind, size.dimension, toMm);
  const words = `Moved along the rail to ${formatLength(toMm, "mm")}, and the accepted band with it: ${span(band)}.`;
  return { ...size, asNewMm: toMm, ...band, basis: [...size.basis, words] };
}

/** A size that was only set on the rail, without a reading or a register behind it. */
export function placedDimension(kind: PartKind, dimension: DimensionName, atMm: number): NeedDimension {
  const band = defaultBand(kind, dimension, atMm);
  return {
    dimension,
    text: null,
    echo: formatLength(atMm, "mm"),
    asFoundMm: null,
    asNewMm: atMm,
    standardUncertaintyMm: 0,
    ...band,
    bandFrom: "common-practice",
    basis: [`Set on the rail at ${formatLength(atMm, "mm")}.`, usual(band)],
  };
}
