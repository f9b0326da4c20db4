import type { RequestHandler } from 'express';
import helmet from 'helmet';
import type { Config } from '../config/config.ts';

const self = "'self'";

/** Headers that keep a browser from loading, framing or running what is not ours; on every answer. */
export function securityHeaders(config: Config): RequestHandler {
  const secure = config.cookieSecure;
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: [self],
        scriptSrc: [self],
        scriptSrcAttr: ["'none'"],
        // Vuetify writes its theme into a style element.
        styleSrc: [self, "'unsafe-inline'"],
        imgSrc: [self, 'data:', 'blob:'],
        fontSrc: [self],
        connectSrc: [self],
        workerSrc: [self, 'blob:'],
        objectSrc: ["'none'"],
        baseUri: [self],
        formAction: [self],
        frameAncestors: ["'none'"],
        ...(secure ? { upgradeInsecureRequests: [] } : {}),
      },
    },
    strictTransportSecurity: secure ? { maxAge: 31_536_000, includeSubDomains: true } : false,
    xFrameOptions: { action: 'deny' },
  });
}
