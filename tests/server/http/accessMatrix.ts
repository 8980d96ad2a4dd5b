/**
 * Who may call what, by role (OWASP ASVS 5.0.0, 8.1.1). A call of the interface that is not listed fails the test.
 *
 * `open`: anybody. `own`: whoever is signed in, and what they reach is theirs alone, others' answering 404.
 */
export const accessMatrix: Record<string, "open" | "own"> = {
  "get /auth/session": "open",
  "post /auth/sign-up": "open",
  "post /auth/sign-in": "open",
  "post /auth/sign-out": "open",
  "post /auth/sign-out-everywhere": "own",
  "post /auth/verify-email": "open",
  "post /auth/send-verification": "own",
  "post /auth/request-password-reset": "open",
  "post /auth/reset-password": "open",
  "post /auth/change-password": "own",
  "get /search": "open",
  "get /parts/:id": "open",
  "get /families": "open",
  "get /families/:slug": "open",
  "get /workshops": "open",
  "get /workshops/:slug": "open",
  "get /countries": "open",
  "get /basket": "open",
  "put /basket/lines/:partId": "open",
  "delete /basket/lines/:partId": "open",
  "get /addresses": "own",
  "post /addresses": "own",
  "delete /addresses/:id": "own",
  "post /orders": "own",
  "get /orders": "own",
  "get /orders/:id": "own",
  "post /orders/:id/pay": "own",
  "post /orders/:id/cancel": "own",
};
