import { AppError } from "../errors/AppError";
import type { Actor } from "./Actor";

type Policy<Target> = { read: (actor: Actor, target: Target) => boolean } & Record<
  string,
  (actor: Actor, target: Target) => boolean
>;

/**
 * Lets the actor go on, or throws: 404 for what is not there or not theirs to see, 403 for what they see but may not do.
 */
export function authorize<Target, P extends Policy<Target>>(
  policy: P,
  actor: Actor,
  verb: keyof P & string,
  target: Target | null,
): asserts target is Target {
  if (target === null || !policy.read(actor, target)) throw new AppError("not-found");
  if (!policy[verb]?.(actor, target)) throw new AppError("not-allowed");
}
