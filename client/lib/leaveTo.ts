/** Leaves our pages for another site's, such as the payment service's own. */
export function leaveTo(url: string): void {
  window.location.assign(url);
}
