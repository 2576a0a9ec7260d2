import { promisify } from 'node:util';
import { gunzip } from 'node:zlib';
import { Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { Sequelize } from 'sequelize-typescript';
import type { StationPrincipal } from '../auth/principals.js';
import { type Page, readCursor, toPage } from '../common/cursor.js';
import { NotFoundError } from '../common/errors.js';
import { CatalogueService } from '../products/catalogue.service.js';
import { StationRegister } from '../stations/station-register.service.js';
import { ResultDetailDto } from './dto/result-detail.dto.js';
import { ResultQueryDto } from './dto/result-query.dto.js';
import { RunItemDto, toRunItemDto } from './dto/run-item.dto.js';
import { analysePost } from './evaluate-post.js';
import { ResultBody } from './models/result-body.model.js';
import { Result } from './models/result.model.js';
import { decodeUtf8 } from './parse-post.js';
import { toResultDetail } from './to-result-detail.js';
import type { PostedResult } from './result.types.js';
import { findRunItems, type RunItemFilter } from './run-items.queries.js';

const unpack = promisify(gunzip);

@Injectable()
export class ResultReadsService {
  constructor(
    @InjectConnection() private readonly sequelize: Sequelize,
    private readonly catalogue: CatalogueService,
    private readonly register: StationRegister,
  ) {}

  async list({ cursor, limit = 50, ...filter }: ResultQueryDto): Promise<Page<RunItemDto>> {
    const rows = await findRunItems(this.sequelize, { ...filter, before: readCursor(cursor) }, limit + 1);
    return toPage(rows, limit, (row) => row.resultId, toRunItemDto);
  }

  async newest(filter: RunItemFilter, count: number): Promise<RunItemDto[]> {
    return (await findRunItems(this.sequelize, filter, count)).map(toRunItemDto);
  }

  /** Run items by row id, for lists of other things that name results. */
  async byRowIds(resultIds: readonly number[]): Promise<Map<number, RunItemDto>> {
    if (resultIds.length === 0) return new Map();
    const rows = await findRunItems(this.sequelize, { resultIds }, resultIds.length);
    return new Map(rows.map((row) => [row.resultId, toRunItemDto(row)]));
  }

  /** @throws NotFoundError also for another station's result, so that a key tells nothing about it. */
  async detail(resultUuid: string, station: StationPrincipal | undefined): Promise<ResultDetailDto> {
    const [row] = await findRunItems(this.sequelize, { resultUuid }, 1);
    if (row === undefined || (station !== undefined && row.station !== station.station)) {
      throw new NotFoundError(`The result "${resultUuid.slice(0, 64)}"`);
    }
    const [result, post] = await Promise.all([
      Result.findByPk(row.resultId, { rejectOnEmpty: true }),
      this.post(row.resultId),
    ]);
    const { product, stage } = this.catalogue.byStage(row.stageId);
    const plan = stage.plans.find((candidate) => candidate.version === result.answer.testPlanVersion) ?? null;
    const ammeter = this.register.instrument('ammeter', post.ammeter?.serialNumber);
    const analysis = analysePost(post, { product, ammeter }, plan);
    return toResultDetail({ item: toRunItemDto(row), result, post, analysis, product, plan });
  }

  /** The post exactly as it was received. */
  async rawPost(resultUuid: string): Promise<Buffer> {
    const result = await Result.findOne({
      where: { resultUuid: resultUuid.toLowerCase() },
      attributes: ['resultId'],
    });
    if (result === null) throw new NotFoundError(`The result "${resultUuid.slice(0, 64)}"`);
    return this.body(result.resultId);
  }

  private async post(resultId: number): Promise<PostedResult> {
    return JSON.parse(decodeUtf8(await this.body(resultId))) as PostedResult;
  }

  private async body(resultId: number): Promise<Buffer> {
    const { body } = await ResultBody.findByPk(resultId, { rejectOnEmpty: true });
    return unpack(body);
  }
}
