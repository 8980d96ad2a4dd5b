import type { Endpoint } from "../http/endpoint";
import type { Services } from "../Services";

/** Every call of the interface. One that is not listed here is neither served nor described. */
export function endpointsOf(_services: Services): Endpoint[] {
  return [];
}
