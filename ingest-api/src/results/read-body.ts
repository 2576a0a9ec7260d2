import { promisify } from 'node:util';
import { gunzip } from 'node:zlib';
import type { Request } from 'express';
import getRawBody from 'raw-body';
import { AmpkeepError, MalformedError } from '../common/errors.js';

/** 500 points with every property come to about 120 kB. */
const LARGEST_POST_BYTES = 1_000_000;
const inflate = promisify(gunzip);

/** The body arrived whole, but can't be unpacked. */
export class NotUnpackableError extends MalformedError {
  constructor(readonly bytes: Buffer) {
    super("The body says it is gzip but can't be unpacked.");
  }
}

class TooLargeError extends AmpkeepError {
  constructor() {
    super(413, 'too_large', 'Too large', `A post may have up to ${LARGEST_POST_BYTES} bytes, unpacked.`);
  }
}

class UnsupportedMediaTypeError extends AmpkeepError {
  constructor(detail: string) {
    super(415, 'unsupported_media_type', 'This content type is not read here', detail);
  }
}

/**
 * Reads a station's body as bytes, gzip allowed. Called after the key was checked, so strangers can't make
 * the server read megabytes.
 * @throws 413 too large, 415 not JSON by its header, 400 broken off or not gzip.
 */
export async function readJsonBytes(request: Request): Promise<Buffer> {
  if (!request.is('application/json')) {
    throw new UnsupportedMediaTypeError('Send the result with Content-Type: application/json.');
  }
  const encoding = request.headers['content-encoding']?.toLowerCase() ?? 'identity';
  if (encoding !== 'identity' && encoding !== 'gzip') {
    throw new UnsupportedMediaTypeError(
      `Content-Encoding may be gzip or left out; "${encoding.slice(0, 40)}" is not read here.`,
    );
  }
  const bytes = await readRaw(request);
  return encoding === 'gzip' ? unpack(bytes) : bytes;
}

async function readRaw(request: Request): Promise<Buffer> {
  try {
    return await getRawBody(request, {
      limit: LARGEST_POST_BYTES,
      length: request.headers['content-length'],
    });
  } catch (error) {
    if ((error as { type?: string }).type === 'entity.too.large') throw new TooLargeError();
    throw new MalformedError('The body broke off before its announced length.');
  }
}

async function unpack(bytes: Buffer): Promise<Buffer> {
  try {
    return await inflate(bytes, { maxOutputLength: LARGEST_POST_BYTES });
  } catch (error) {
    if ((error as { code?: string }).code === 'ERR_BUFFER_TOO_LARGE') throw new TooLargeError();
    throw new NotUnpackableError(bytes);
  }
}
