import type { RequestHandler } from 'express';
import helmet from 'helmet';

/** What the page may load and do. Scripts only from files of our own; no eval, no inline. */
const POLICY = {
  defaultSrc: ["'self'"],
  scriptSrc: ["'self'", "'wasm-unsafe-eval'"],
  scriptSrcAttr: ["'none'"],
  styleSrc: ["'self'"],
  fontSrc: ["'self'"],
  imgSrc: ["'self'", 'data:', 'blob:'],
  connectSrc: ["'self'"],
  workerSrc: ["'self'"],
  manifestSrc: ["'self'"],
  frameSrc: ["'none'"],
  objectSrc: ["'none'"],
  baseUri: ["'self'"],
  formAction: ["'self'"],
  frameAncestors: ["'none'"],
};

const DENIED = [
  'accelerometer',
  'autoplay',
  'browsing-topics',
  'camera',
  'display-capture',
  'geolocation',
  'gyroscope',
  'hid',
  'magnetometer',
  'microphone',
  'midi',
  'payment',
  'publickey-credentials-get',
  'serial',
  'usb',
];
const PERMISSIONS = DENIED.map((name) => `${name}=()`).join(', ');

/**
 * The headers that every answer carries. HSTS and `upgrade-insecure-requests` only
 * when people reach the hub by https: on a plain http address they break the page.
 */
export function securityHeaders(secure: boolean): RequestHandler[] {
  const directives = secure ? { ...POLICY, upgradeInsecureRequests: [] } : POLICY;
  return [
    helmet({
      contentSecurityPolicy: { useDefaults: false, directives },
      referrerPolicy: { policy: 'no-referrer' },
      crossOriginOpenerPolicy: { policy: 'same-origin' },
      crossOriginResourcePolicy: { policy: 'same-origin' },
      frameguard: { action: 'deny' },
      hsts: secure ? { maxAge: 31_536_000, includeSubDomains: false } : false,
    }),
    (_request, response, next) => {
      response.setHeader('Permissions-Policy', PERMISSIONS);
      next();
    },
  ];
}
