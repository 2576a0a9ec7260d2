import { existsSync } from 'node:fs';
import { join } from 'node:path';
import type { NestExpressApplication } from '@nestjs/platform-express';
import express, { type NextFunction, type Request, type Response } from 'express';

/** The built dashboard, beside this package; absent while developing, when Vite serves it. */
const dashboardFolder = join(__dirname, '../../../dashboard/dist');

const YEAR_SECONDS = 31_536_000;

/** Serves the dashboard: its hashed files for ever, and its page for every address that is no file nor API. */
export function serveDashboard(app: NestExpressApplication, folder = dashboardFolder): void {
  const page = join(folder, 'index.html');
  if (!existsSync(page)) return;
  app.use(
    '/assets',
    express.static(join(folder, 'assets'), {
      immutable: true,
      maxAge: YEAR_SECONDS * 1000,
      fallthrough: false,
    }),
  );
  app.use(express.static(folder, { index: false, maxAge: 0 }));
  app.use((request: Request, response: Response, next: NextFunction) => {
    const isPage =
      (request.method === 'GET' || request.method === 'HEAD') &&
      !/^\/(api|docs)(\/|$)/.test(request.path) &&
      request.accepts('html') !== false;
    if (!isPage) next();
    else response.set('Cache-Control', 'no-cache').sendFile(page);
  });
}
