import { promisify } from 'node:util';
import { gunzip } from 'node:zlib';
import { Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { Sequelize } from 'sequelize-typescript';
import { type ErrorPlace, InvalidError, NotFoundError } from '../common/errors.js';
import { StationRegister } from '../stations/station-register.service.js';
import type { IntakeItemDto, IntakePageDto, IntakeQueryDto, RefusedPostDto } from './dto/intake.dto.js';
import { findIntake, type IntakeCursor, type IntakeRow } from './intake.queries.js';
import { RefusedPost } from './models/refused-post.model.js';

const unpack = promisify(gunzip);

/** Reads of everything that came in. */
@Injectable()
export class IntakeService {
  constructor(
    @InjectConnection() private readonly sequelize: Sequelize,
    private readonly register: StationRegister,
  ) {}

  async list({ kind = 'all', station, cursor, limit = 50 }: IntakeQueryDto): Promise<IntakePageDto> {
    const rows = await findIntake(
      this.sequelize,
      { kind, station: station ?? null, cursor: readIntakeCursor(cursor) },
      limit + 1,
    );
    const shown = rows.slice(0, limit);
    const last = shown.at(-1);
    const more = rows.length > limit && last !== undefined;
    return {
      items: shown.map(toItem),
      nextCursor: more ? `${last.lastReceivedAt}-${last.accepted}-${last.rowId}` : null,
    };
  }

  async refused(intakeId: string): Promise<RefusedPostDto> {
    const rowId = /^x(\d{1,15})$/.exec(intakeId)?.[1];
    const post = rowId === undefined ? null : await RefusedPost.findByPk(Number(rowId));
    if (post === null) throw new NotFoundError(`The refused post "${intakeId.slice(0, 40)}"`);
    const body = await unpack(post.body);
    return {
      intakeId,
      kind: 'refused',
      receivedAt: new Date(post.firstReceivedAt).toISOString(),
      lastReceivedAt: new Date(post.lastReceivedAt).toISOString(),
      count: post.times,
      station: this.register.byId(post.stationId).name,
      status: post.status,
      resultId: post.resultUuid,
      partNumber: post.partNumber,
      serialNumber: post.serialNumber,
      verdict: null,
      errors: post.errors,
      title: post.title,
      detail: post.detail,
      body: body.toString('utf8'),
      bodyBytes: post.bodyBytes,
      bodyTruncated: post.truncated,
    };
  }
}

function readIntakeCursor(cursor: string | undefined): IntakeCursor | null {
  if (cursor === undefined || cursor === '') return null;
  const match = /^(\d{1,15})-([01])-(\d{1,15})$/.exec(cursor);
  if (match === null) {
    throw new InvalidError([
      {
        pointer: '/cursor',
        code: 'cursor',
        detail: 'Is no cursor of this list; leave it out to begin anew.',
      },
    ]);
  }
  return { lastReceivedAt: Number(match[1]), accepted: Number(match[2]), rowId: Number(match[3]) };
}

function toItem(row: IntakeRow): IntakeItemDto {
  return {
    intakeId: `${row.accepted === 1 ? 'r' : 'x'}${row.rowId}`,
    kind: row.accepted === 1 ? 'accepted' : 'refused',
    receivedAt: new Date(row.receivedAt).toISOString(),
    lastReceivedAt: new Date(row.lastReceivedAt).toISOString(),
    count: row.times,
    station: row.station,
    status: row.status,
    resultId: row.resultUuid,
    partNumber: row.partNumber,
    serialNumber: row.serialNumber,
    verdict: row.verdict,
    errors: JSON.parse(row.errors) as ErrorPlace[],
  };
}
