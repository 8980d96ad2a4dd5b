import type { RequestHandler } from "express";
import helmet from "helmet";

/**
 * The headers of every answer: nothing from elsewhere, no framing, no sniffing (OWASP ASVS 5.0.0, 3.4).
 * The payment page is another site that the browser is sent to, so no third-party script or frame is allowed here.
 */
export function securityHeaders({ secure, payOrigin }: { secure: boolean; payOrigin: string }): RequestHandler[] {
  return [
    helmet({
      contentSecurityPolicy: {
        useDefaults: false,
        directives: {
          defaultSrc: ["'none'"],
          scriptSrc: ["'self'"],
          styleSrc: ["'self'"],
          imgSrc: ["'self'", "data:"],
          fontSrc: ["'self'"],
          connectSrc: ["'self'"],
          manifestSrc: ["'self'"],
          formAction: ["'self'", payOrigin],
          baseUri: ["'none'"],
          frameAncestors: ["'none'"],
          objectSrc: ["'none'"],
        },
      },
      strictTransportSecurity: secure ? { maxAge: 63_072_000, includeSubDomains: true } : false,
      referrerPolicy: { policy: "strict-origin-when-cross-origin" },
      crossOriginOpenerPolicy: { policy: "same-origin" },
      crossOriginResourcePolicy: { policy: "same-origin" },
      xPoweredBy: true,
    }),
    (_req, res, next) => {
      res.set("Permissions-Policy", "camera=(), geolocation=(), microphone=(), payment=(), usb=()");
      next();
    },
  ];
}
