const minute = 60_000;

/** How long stock is held for an order that waits for payment. */
export const holdMs = 35 * minute;

/**
 * How long before the end of the hold the payment page closes, so that a payment of the last second still finds its
 * stock. The page then lives 33 minutes; the provider asks for 30 at least, counted from when its call arrives.
 */
export const pageClosesBeforeMs = 2 * minute;

/** Orders of one buyer that may wait for payment at once, so that nobody holds a workshop's stock for nothing. */
export const mostWaitingOrders = 5;

/** The queue keeps one job of this key: the one that ends the hold of an order. */
export const expiryKey = (orderId: string): string => `expire:${orderId}`;
