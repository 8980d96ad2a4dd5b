import type { Endpoint } from "../http/endpoint";
import type { Services } from "../Services";
import { authRoutes } from "./auth";

/** Every call of the interface. One that is not listed here is neither served nor described. */
export function endpointsOf(services: Services): Endpoint[] {
  return [...authRoutes(services)];
}
