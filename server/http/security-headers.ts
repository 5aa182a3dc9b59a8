import type { RequestHandler } from 'express';
import helmet from 'helmet';

const self = "'self'";
const none = "'none'";

/** Everything comes from this server; nothing inline, nothing framed. */
const contentSecurityPolicy = {
  useDefaults: false,
  directives: {
    defaultSrc: [none],
    scriptSrc: [self],
    styleSrc: [self],
    imgSrc: [self, 'data:', 'blob:'],
    fontSrc: [self],
    connectSrc: [self],
    manifestSrc: [self],
    workerSrc: [self],
    baseUri: [none],
    formAction: [self],
    frameAncestors: [none],
  },
};

/** Nothing here looks, listens, pays or asks where somebody is. */
const permissionsPolicy = [
  ...['accelerometer', 'bluetooth', 'camera', 'display-capture', 'geolocation', 'gyroscope'],
  ...['hid', 'magnetometer', 'microphone', 'midi', 'payment', 'serial', 'usb'],
]
  .map((feature) => `${feature}=()`)
  .join(', ');

export const securityHeaders = (options: {
  readonly overHttps: boolean;
  readonly strict: boolean;
}): RequestHandler => {
  const others = helmet({
    contentSecurityPolicy: options.strict ? contentSecurityPolicy : false,
    strictTransportSecurity: options.overHttps,
    referrerPolicy: { policy: 'no-referrer' },
    xFrameOptions: { action: 'deny' },
  });
  return (request, response, next) => {
    response.setHeader('Permissions-Policy', permissionsPolicy);
    others(request, response, next);
  };
};
