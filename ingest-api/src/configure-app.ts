import { type INestApplication, ValidationPipe, type ValidationError } from '@nestjs/common';
import type { NestExpressApplication } from '@nestjs/platform-express';
import compression from 'compression';
import cookieParser from 'cookie-parser';
import express, { type NextFunction, type Request, type Response } from 'express';
import helmet from 'helmet';
import { InvalidError } from './common/errors.js';
import { ProblemFilter } from './common/problem.filter.js';
import { pointerOf } from './results/parse-post.js';

/** Bodies that the station routes read themselves, after the key was checked. Routes match in any case. */
const readsItsOwnBody = (request: Request): boolean =>
  request.path.toLowerCase().startsWith('/api/v1/results');

/** Everything that wraps the routes; shared by main and the tests. */
export function configureApp(app: INestApplication): void {
  const json = express.json({ limit: '100kb', strict: true });
  (app as NestExpressApplication).disable('x-powered-by');
  (app as NestExpressApplication).set('query parser', 'simple');
  // A reverse proxy on this machine names the caller's address.
  (app as NestExpressApplication).set('trust proxy', 'loopback');
  app.use(helmet({ contentSecurityPolicy: { directives: contentSources }, strictTransportSecurity: false }));
  app.use(compression());
  app.use(cookieParser());
  app.use((request: Request, response: Response, next: NextFunction) => {
    if (readsItsOwnBody(request)) next();
    else json(request, response, next);
  });
  app.setGlobalPrefix('api/v1');
  app.useGlobalPipes(
    new ValidationPipe({
      transform: true,
      whitelist: true,
      forbidNonWhitelisted: true,
      exceptionFactory: toInvalidError,
    }),
  );
  app.useGlobalFilters(new ProblemFilter());
  app.enableShutdownHooks();
}

/** Everything comes from this server. Charts and the component library set inline styles. */
const contentSources = {
  defaultSrc: ["'self'"],
  scriptSrc: ["'self'"],
  styleSrc: ["'self'", "'unsafe-inline'"],
  imgSrc: ["'self'", 'data:', 'blob:'],
  fontSrc: ["'self'", 'data:'],
  connectSrc: ["'self'"],
  frameSrc: ["'self'"],
  objectSrc: ["'none'"],
  baseUri: ["'self'"],
  formAction: ["'self'"],
  frameAncestors: ["'none'"],
  upgradeInsecureRequests: null,
};

function toInvalidError(faults: ValidationError[]): InvalidError {
  return new InvalidError(faults.flatMap((fault) => placesOf(fault, [])));
}

function placesOf(
  fault: ValidationError,
  above: readonly string[],
): { pointer: string; code: string; detail: string }[] {
  const path = [...above, fault.property];
  const own = Object.entries(fault.constraints ?? {}).map(([code, detail]) => ({
    pointer: pointerOf(path),
    code,
    detail,
  }));
  return [...own, ...(fault.children ?? []).flatMap((child) => placesOf(child, path))];
}
