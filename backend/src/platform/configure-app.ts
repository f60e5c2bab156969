import type { NestExpressApplication } from '@nestjs/platform-express';
import compression from 'compression';
import cookieParser from 'cookie-parser';
import express from 'express';
import helmet from 'helmet';
import type { Config } from './config';
import { refuseForeignRequests, refuseUnreadableAddresses } from './request-guards';
import { lineBatch } from './line-batch';
import { requestLog } from './request-log';
import { staticPages } from './static-pages';

export const JSON_LIMIT = '1mb';

/** What stands before the controllers. The application must be created with `bodyParser: false`. */
export function configureApp(app: NestExpressApplication, config: Config): void {
  app.disable('x-powered-by');
  // An ETag here is the version of what was asked for, not a hash of the bytes.
  app.set('etag', false);
  app.set('query parser', 'simple');
  if (config.trustProxy) app.set('trust proxy', config.trustProxy);
  app.use(requestLog(config.requestLog ? lineBatch((text) => process.stdout.write(text)) : null));
  app.use(headers(config));
  app.use(compression({ threshold: 1024 }));
  app.use(refuseUnreadableAddresses);
  app.use(staticPages(config.frontendFolder));
  app.use(refuseForeignRequests);
  app.use(cookieParser());
  app.use(express.json({ limit: JSON_LIMIT, type: 'application/json' }));
  app.enableShutdownHooks();
}

function headers({ secureCookie }: Config) {
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        scriptSrc: ["'self'"],
        scriptSrcAttr: ["'none'"],
        // The component library writes its theme into style elements.
        styleSrc: ["'self'", "'unsafe-inline'"],
        fontSrc: ["'self'"],
        imgSrc: ["'self'", 'data:', 'blob:'],
        connectSrc: ["'self'"],
        objectSrc: ["'none'"],
        baseUri: ["'self'"],
        formAction: ["'self'"],
        frameAncestors: ["'none'"],
      },
    },
    frameguard: { action: 'deny' },
    referrerPolicy: { policy: 'no-referrer' },
    strictTransportSecurity: secureCookie ? { maxAge: 365 * 24 * 3600 } : false,
  });
}
