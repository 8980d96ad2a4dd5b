import { DomainError } from "./DomainError";
import { requireWithin } from "./requireWithin";
import { speedBounds } from "./speedBounds";

export type Motor = { mainsHz: number; poles: number; slipPercent: number };

/** Speed of the field that a mains motor follows, in rpm: 120 f / p. */
function synchronousSpeed({ mainsHz, poles }: Omit<Motor, "slipPercent">): number {
  requireWithin("mainsHz", mainsHz, ...speedBounds.mainsHz, "Hz");
  const [min, max] = speedBounds.poles;
  if (!(poles >= min && poles <= max && poles % 2 === 0)) {
    throw new DomainError("poles", `A motor has an even number of poles, from ${min} to ${max}.`);
  }
  return (120 * mainsHz) / poles;
}

/**
 * Speed of a mains motor in rpm: 120 f / p (1 - s / 100).
 *
 * Limits: 10 to 400 Hz, an even number of poles from 2 to 48, slip from 0 (synchronous) to below 100 %.
 * Errors: DomainError on "mainsHz", "poles", "slipPercent".
 * Source: the definition of slip, s = (synchronous - rotor) / synchronous, as textbooks of electrical machines give it.
 */
export function motorSpeed(motor: Motor): number {
  const synchronous = synchronousSpeed(motor);
  const { slipPercent } = motor;
  if (!(slipPercent >= 0 && slipPercent < 100)) {
    throw new DomainError("slipPercent", "Slip is from 0 % up to less than 100 %.");
  }
  // 100 - s first: 1 - s / 100 would lose the last digits of a small slip.
  return (synchronous * (100 - slipPercent)) / 100;
}

/**
 * Slip in percent of a motor that was measured to turn at `motorRpm`: the inverse of `motorSpeed`.
 *
 * Errors: as there, and DomainError on "motorRpm" where it stands still or outruns its field, which no mains motor does.
 */
export function slipOfMotor({ motorRpm, ...motor }: Omit<Motor, "slipPercent"> & { motorRpm: number }): number {
  const synchronous = synchronousSpeed(motor);
  const slipPercent = ((synchronous - motorRpm) / synchronous) * 100;
  if (slipPercent >= 0 && slipPercent < 100) return slipPercent;
  const most = Number(synchronous.toPrecision(6));
  throw new DomainError("motorRpm", `With ${motor.poles} poles at ${motor.mainsHz} Hz it turns at most ${most} rpm.`);
}
