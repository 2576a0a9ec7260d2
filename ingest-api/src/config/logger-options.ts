import type { Params } from 'nestjs-pino';
import type { Env } from './env.js';

/** Log lines carry no secret: neither keys nor cookies nor bodies. */
export function loggerOptions(env: Env): Params {
  return {
    pinoHttp: {
      level: env.logLevel,
      autoLogging: false,
      quietReqLogger: true,
      redact: {
        paths: [
          'req.headers["x-api-key"]',
          'req.headers.cookie',
          'req.headers.authorization',
          'res.headers["set-cookie"]',
        ],
        remove: true,
      },
    },
  };
}
