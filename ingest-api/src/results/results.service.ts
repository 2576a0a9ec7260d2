import { Inject, Injectable } from '@nestjs/common';
import type { Request } from 'express';
import { DateTime } from 'luxon';
import { BreachRecorder } from '../breaches/breach-recorder.js';
import type { StationPrincipal } from '../auth/principals.js';
import { AmpkeepError } from '../common/errors.js';
import { CLOCK, type Clock, ENV } from '../config/config.module.js';
import type { Env } from '../config/env.js';
import { Writer } from '../database/writer.js';
import { RefusedPostsService } from '../intake/refused-posts.service.js';
import { LiveService } from '../live/live.service.js';
import { findStage } from '../products/catalogue.js';
import { CatalogueService } from '../products/catalogue.service.js';
import { GoldenChecksService } from '../stations/golden-checks.service.js';
import { StationRegister } from '../stations/station-register.service.js';
import { checkPost } from './check-post.js';
import { type EvaluationContext, evaluatePost } from './evaluate-post.js';
import { ceilingOf } from './impedance-ceiling-of.js';
import { parsePost } from './parse-post.js';
import { NotUnpackableError, readJsonBytes } from './read-body.js';
import { prepareResult } from './prepare-result.js';
import type { PreparedResult } from './prepared-result.js';
import { ResultWriter } from './result-writer.js';
import type { PostedResult, ResultAnswer } from './result.types.js';
import { findWarnings } from './warnings.js';

const keptStatuses = new Set([400, 409, 422]);

export interface RecordOptions {
  /** Demo history: opens breaches but sends no mail. */
  seeded?: boolean;
  /** When it came in, for demo history; now otherwise. */
  receivedAt?: number;
}

export interface Recorded {
  /** False for a replay of what was stored before. */
  isNew: boolean;
  answer: ResultAnswer;
}

/** The door for every result: read, check, compute, judge, store, answer. */
@Injectable()
export class ResultsService {
  constructor(
    private readonly catalogue: CatalogueService,
    private readonly register: StationRegister,
    private readonly goldenChecks: GoldenChecksService,
    private readonly refusedPosts: RefusedPostsService,
    private readonly writer: Writer,
    private readonly resultWriter: ResultWriter,
    private readonly breaches: BreachRecorder,
    private readonly live: LiveService,
    @Inject(ENV) private readonly env: Env,
    @Inject(CLOCK) private readonly now: Clock,
  ) {}

  /** Takes a station's request: as `record`, but what can't even be unpacked is kept in the intake, too. */
  async receive(request: Request, station: StationPrincipal): Promise<Recorded> {
    const bytes = await readJsonBytes(request).catch(async (error: unknown) => {
      if (error instanceof NotUnpackableError) {
        await this.refusedPosts.keep({ bytes: error.bytes, error, station, content: undefined });
      }
      throw error;
    });
    return this.record(bytes, station);
  }

  /**
   * Takes a post as it came. Resolves after its commit.
   * @throws MalformedError 400, InvalidError 422, ConflictError 409 (each kept in the intake),
   * StoreUnavailableError 503.
   */
  async record(bytes: Buffer, station: StationPrincipal, options: RecordOptions = {}): Promise<Recorded> {
    let content: unknown;
    try {
      content = parsePost(bytes);
      const post = checkPost(content, {
        now: this.now(),
        findProduct: (partNumber) => this.catalogue.find(partNumber),
      });
      return await this.store(this.prepare(bytes, post, station, options), station);
    } catch (error) {
      if (error instanceof AmpkeepError && keptStatuses.has(error.status)) {
        await this.refusedPosts.keep({ bytes, error, station, content });
      }
      throw error;
    }
  }

  private async store(prepared: PreparedResult, station: StationPrincipal): Promise<Recorded> {
    const outcome = await this.writer.submit(this.resultWriter, prepared);
    if (outcome.kind === 'refused') throw outcome.error;
    if (outcome.kind === 'stored') {
      if (prepared.runKind === 'golden')
        this.goldenChecks.note(station.stationId, prepared.productId, prepared.startedAt);
      this.breaches.afterCommit(outcome.breaches);
      this.live.publish({ topic: 'results', id: prepared.resultUuid });
    }
    return { isNew: outcome.kind === 'stored', answer: outcome.answer };
  }

  private prepare(
    bytes: Buffer,
    post: PostedResult,
    station: StationPrincipal,
    options: RecordOptions,
  ): PreparedResult {
    const product = this.catalogue.find(post.partNumber)!;
    const receivedAt = options.receivedAt ?? this.now();
    const context: EvaluationContext = {
      product,
      stage: findStage(product, post.stage)!,
      ammeter: this.register.instrument('ammeter', post.ammeter?.serialNumber),
      voltmeter: this.register.instrument('voltmeter', post.voltmeter?.serialNumber),
      practiceKey: station.practice,
      receivedAt,
    };
    const evaluation = evaluatePost(post, context);
    const warnings = findWarnings(post, context, evaluation, {
      today: DateTime.fromMillis(receivedAt, { zone: this.env.timeZone }).toISODate() ?? '',
      lastGoldenAt: this.goldenChecks.lastGoldenAt(station.stationId, product.productId),
      ceilingOhms: ceilingOf(evaluation.analysis),
    });
    const { stationId, apiKeyId } = station;
    return prepareResult(
      { bytes, post, stationId, apiKeyId, seeded: options.seeded ?? false },
      context,
      evaluation,
      warnings,
    );
  }
}
