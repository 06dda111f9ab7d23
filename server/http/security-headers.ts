import type { RequestHandler } from 'express';
import helmet from 'helmet';

const policy = (underHttps: boolean, fromSources: boolean): RequestHandler =>
  helmet({
    // Vite serves sources with inline scripts and styles.
    contentSecurityPolicy: !fromSources && {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        scriptSrc: ["'self'"],
        styleSrc: ["'self'"],
        // data: and blob: for pictures made in the page; blob: in frames for the setup sheet's preview.
        imgSrc: ["'self'", 'data:', 'blob:'],
        fontSrc: ["'self'"],
        connectSrc: ["'self'"],
        frameSrc: ["'self'", 'blob:'],
        objectSrc: ["'self'"],
        baseUri: ["'self'"],
        formAction: ["'self'"],
        frameAncestors: ["'self'"],
        ...(underHttps ? { upgradeInsecureRequests: [] } : {}),
      },
    },
    referrerPolicy: { policy: 'same-origin' },
    // Over plain HTTP these would be wrong (HSTS) or are ignored with a warning.
    strictTransportSecurity: underHttps,
    crossOriginOpenerPolicy: underHttps,
    originAgentCluster: underHttps,
  });

/** Security headers; those that belong to HTTPS are sent under HTTPS only. No content policy while the client is served from its sources. */
export function securityHeaders(fromSources: boolean): RequestHandler {
  const https = policy(true, fromSources);
  const http = policy(false, fromSources);
  return (req, res, next) => (req.secure ? https : http)(req, res, next);
}
