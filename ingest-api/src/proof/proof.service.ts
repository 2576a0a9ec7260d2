import { join } from 'node:path';
import { Inject, Injectable, type OnApplicationShutdown } from '@nestjs/common';
import { Piscina } from 'piscina';
import { CLOCK, type Clock } from '../config/config.module.js';
import { ampkeepVersion } from '../config/version.js';
import { type ProofDto, toProofDto } from './dto/proof.dto.js';
import type { ProofRow } from './proof.types.js';

/** Where the sources run as they are (tests), the worker needs a loader for TypeScript. */
const runsFromSources = __filename.endsWith('.ts');
const workerFile = join(__dirname, runsFromSources ? 'proof.worker.ts' : 'proof.worker.js');
const loader = runsFromSources ? ['--require', join(__dirname, '../../test/load-typescript.cjs')] : [];

@Injectable()
export class ProofService implements OnApplicationShutdown {
  private pool: Piscina<undefined, ProofRow[]> | null = null;
  private running: Promise<ProofRow[]> | null = null;

  constructor(@Inject(CLOCK) private readonly now: Clock) {}

  /** Computes all published cases anew; people who ask while that goes on share its outcome. */
  async prove(): Promise<ProofDto> {
    this.running ??= this.workers()
      .run(undefined)
      .finally(() => {
        this.running = null;
      });
    const rows = await this.running;
    return toProofDto(rows, new Date(this.now()), ampkeepVersion);
  }

  async onApplicationShutdown(): Promise<void> {
    await this.pool?.destroy();
  }

  /** Started at the first question, for most days nobody asks; an idle thread ends. */
  private workers(): Piscina<undefined, ProofRow[]> {
    this.pool ??= new Piscina<undefined, ProofRow[]>({
      filename: workerFile,
      execArgv: loader,
      minThreads: 0,
      maxThreads: 1,
      idleTimeout: 5_000,
    });
    return this.pool;
  }
}
