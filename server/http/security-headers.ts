import { randomBytes } from "node:crypto";
import type { RequestHandler } from "express";
import helmet from "helmet";

declare global {
  namespace Express {
    interface Locals {
      /** Allows this response's own scripts and styles under the content security policy. */
      nonce: string;
    }
  }
}

interface SecurityOptions {
  https: boolean;
  /** The development client puts styles in by script and talks to its compiler by websocket. */
  development: boolean;
}

/** The content security policy and its kin, for every answer. Scripts run by nonce alone. */
export function securityHeaders({ https, development }: SecurityOptions): RequestHandler[] {
  const setNonce: RequestHandler = (_req, res, next) => {
    res.locals.nonce = randomBytes(16).toString("base64");
    next();
  };
  const nonce = (_req: unknown, res: unknown) =>
    `'nonce-${(res as { locals: Express.Locals }).locals.nonce}'`;
  return [
    setNonce,
    helmet({
      contentSecurityPolicy: {
        useDefaults: false,
        directives: {
          defaultSrc: ["'self'"],
          scriptSrc: ["'self'", nonce],
          styleSrc: development ? ["'self'", "'unsafe-inline'"] : ["'self'", nonce],
          styleSrcAttr: ["'unsafe-inline'"],
          imgSrc: ["'self'", "data:", "blob:"],
          fontSrc: ["'self'"],
          connectSrc: development ? ["'self'", "ws:"] : ["'self'"],
          workerSrc: ["'self'"],
          frameSrc: ["'self'"],
          objectSrc: ["'none'"],
          baseUri: ["'none'"],
          formAction: ["'self'"],
          frameAncestors: ["'self'"],
          ...(https && { upgradeInsecureRequests: [] }),
        },
      },
      strictTransportSecurity: https,
      referrerPolicy: { policy: "strict-origin-when-cross-origin" },
    }),
  ];
}
