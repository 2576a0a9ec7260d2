import { type ArgumentsHost, Catch, type ExceptionFilter, HttpException, Logger } from '@nestjs/common';
import { ThrottlerException } from '@nestjs/throttler';
import type { Request, Response } from 'express';
import { AmpkeepError, type ErrorPlace } from './errors.js';

/** RFC 9457 problem document. */
export interface Problem {
  type: string;
  title: string;
  status: number;
  detail: string;
  code: string;
  errors?: readonly ErrorPlace[];
}

const codesByStatus: Record<number, [code: string, title: string]> = {
  400: ['malformed', 'The request could not be read'],
  401: ['not_signed_in', 'Not signed in'],
  403: ['forbidden', 'Not allowed'],
  404: ['not_found', 'Not found'],
  405: ['method_not_allowed', 'Method not allowed'],
  408: ['too_slow', 'The request took too long to arrive'],
  413: ['too_large', 'Too large'],
  415: ['unsupported_media_type', 'This content type is not read here'],
  422: ['invalid', 'The content is not valid'],
  429: ['too_many_requests', 'Too many requests'],
};

/** The `type` of a problem is a place in the shipped docs. */
const typeOf = (code: string): string => `/docs/errors#${code}`;

function problemOf(error: AmpkeepError): Problem {
  const { code, title, status, message: detail, errors } = error;
  return { type: typeOf(code), title, status, detail, code, ...(errors.length > 0 ? { errors } : {}) };
}

/** What body-parser, express and Nest throw carries a status; everything else is ours to answer for. */
function statusOf(exception: unknown): number {
  if (exception instanceof HttpException) return exception.getStatus();
  const status = (exception as { status?: unknown; statusCode?: unknown } | null)?.status;
  return typeof status === 'number' && status >= 400 && status < 500 ? status : 500;
}

function plainProblem(status: number, exception: unknown): Problem {
  const [code, title] = codesByStatus[status] ?? ['internal', 'Something broke on our side'];
  const detail =
    status >= 500
      ? 'The fault is not in your request. It was logged; try again, and tell the administrator if it stays.'
      : ((exception as Error).message ?? title);
  return { type: typeOf(code), title, status, detail, code };
}

/** The one place where an error becomes HTTP. */
@Catch()
export class ProblemFilter implements ExceptionFilter {
  private readonly logger = new Logger(ProblemFilter.name);

  catch(exception: unknown, host: ArgumentsHost): void {
    const response = host.switchToHttp().getResponse<Response>();
    const request = host.switchToHttp().getRequest<Request>();
    const problem =
      exception instanceof AmpkeepError ? problemOf(exception) : plainProblem(statusOf(exception), exception);
    if (problem.status >= 500 && problem.status !== 503)
      this.logger.error({ err: exception, path: request.path }, 'Unexpected error');
    if (response.headersSent) {
      response.end();
      return;
    }
    if (exception instanceof AmpkeepError && exception.retryAfterSeconds !== null) {
      response.setHeader('Retry-After', String(exception.retryAfterSeconds));
    } else if (exception instanceof ThrottlerException && !response.getHeader('Retry-After')) {
      response.setHeader('Retry-After', '60');
    }
    response.status(problem.status).type('application/problem+json').send(JSON.stringify(problem));
  }
}
