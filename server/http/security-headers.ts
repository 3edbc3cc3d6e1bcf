import helmet from 'helmet'
import type { Env } from '../env.ts'

/** Nothing is fetched from outside. Over plain http no header may send phones of the local network to https. */
export const securityHeaders = (env: Env) =>
  helmet({
    contentSecurityPolicy: {
      directives: {
        defaultSrc: ["'self'"],
        // The dialog's scroll lock writes one style element.
        styleSrc: ["'self'", "'unsafe-inline'"],
        imgSrc: ["'self'", 'data:', 'blob:'],
        objectSrc: ["'none'"],
        frameAncestors: ["'none'"],
        upgradeInsecureRequests: null,
      },
    },
    strictTransportSecurity: env.tls,
    crossOriginOpenerPolicy: env.tls,
    originAgentCluster: env.tls,
    referrerPolicy: { policy: 'same-origin' },
  })
