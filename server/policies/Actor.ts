import type { Role } from "#shared/schemas/session";

/** Who asks, as policies see it. */
export type Actor = { id: string; role: Role; workshopId: string | null };

declare global {
  namespace Express {
    // Who is signed in, as passport leaves it on a request.
    interface User extends Actor {}
  }
}
