import type { Params } from 'nestjs-pino';
import type { Env } from './env.js';

/** Nest's inventory of modules and routes at each start: nothing an administrator wants to read. */
const inventory = new Set(['InstanceLoader', 'RoutesResolver', 'RouterExplorer', 'NestFactory']);

const secretHeaders = [
  'req.headers["x-api-key"]',
  'req.headers.cookie',
  'req.headers.authorization',
  'res.headers["set-cookie"]',
];

/** Log lines carry no secret: neither keys nor cookies nor bodies. */
export function loggerOptions(env: Env): Params {
  return {
    forRoutes: ['{*path}'],
    pinoHttp: {
      level: env.logLevel,
      autoLogging: false,
      quietReqLogger: true,
      redact: { paths: secretHeaders, remove: true },
      hooks: {
        logMethod(line, log) {
          const [first] = line as [{ context?: string } | string];
          if (typeof first === 'object' && inventory.has(first.context ?? '')) return;
          log.apply(this, line);
        },
      },
    },
  };
}
