/** The best could not be proved in the time allowed. Nothing is answered then. */
export class NotProved extends Error {
  override readonly name = "NotProved";
}
