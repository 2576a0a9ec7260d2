import { SwaggerModule } from '@nestjs/swagger';
import type { NestExpressApplication } from '@nestjs/platform-express';
import type { Request, Response } from 'express';
import { stringify } from 'yaml';
import { resultSchema } from '../results/validate-post.js';
import { buildOpenApi } from './build-openapi.js';
import { docsStyle } from './docs-style.js';
import { errorsPage } from './errors-page.js';

/** The API docs under /docs: everything they need comes from this server. */
export function serveDocs(app: NestExpressApplication): void {
  let document: ReturnType<typeof buildOpenApi> | undefined;
  const openApi = (): ReturnType<typeof buildOpenApi> => (document ??= buildOpenApi(app));
  app.use('/docs/openapi.yaml', (_request: Request, response: Response) => {
    response.type('application/yaml').send(stringify(openApi()));
  });
  app.use('/docs/result.schema.json', (_request: Request, response: Response) => {
    response.type('application/schema+json').send(JSON.stringify(resultSchema, null, 2));
  });
  app.use('/docs/errors', (_request: Request, response: Response) => {
    response.type('html').send(errorsPage());
  });
  SwaggerModule.setup('docs', app, openApi, {
    customSiteTitle: 'Ampkeep API',
    customCss: docsStyle,
    customfavIcon: '/favicon.svg',
    swaggerOptions: {
      tryItOutEnabled: false,
      persistAuthorization: false,
      docExpansion: 'list',
      validatorUrl: null,
    },
  });
}
