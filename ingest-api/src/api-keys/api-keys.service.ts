import { type BeforeApplicationShutdown, Inject, Injectable, type OnModuleInit } from '@nestjs/common';
import { Interval } from '@nestjs/schedule';
import { AuditService } from '../audit/audit.service.js';
import type { StationPrincipal } from '../auth/principals.js';
import { ForbiddenError, InvalidError, KeyRequiredError, NotFoundError } from '../common/errors.js';
import { CLOCK, type Clock } from '../config/config.module.js';
import { listTable, runStatement } from '../database/sql.js';
import { Writer } from '../database/writer.js';
import { StationRegister } from '../stations/station-register.service.js';
import type { CreateApiKeyDto } from './dto/create-api-key.dto.js';
import { createKey, matchesSecret, splitKey } from './key-secret.js';
import { ApiKey } from './models/api-key.model.js';

const LAST_USE_FLUSH_MS = 30_000;

/** Keys are few and asked for with every post: all of them are held in memory. */
@Injectable()
export class ApiKeysService implements OnModuleInit, BeforeApplicationShutdown {
  private byPrefix = new Map<string, ApiKey>();
  /** Last uses not yet written: one write per half minute, not per post. */
  private readonly unsavedUses = new Map<number, number>();

  constructor(
    private readonly writer: Writer,
    private readonly register: StationRegister,
    private readonly audit: AuditService,
    @Inject(CLOCK) private readonly now: Clock,
  ) {}

  async onModuleInit(): Promise<void> {
    const keys = await ApiKey.findAll();
    this.byPrefix = new Map(keys.map((key) => [key.prefix, key]));
  }

  beforeApplicationShutdown(): Promise<void> {
    return this.saveLastUses();
  }

  /**
   * Says whose key this is.
   * @throws KeyRequiredError (401) when it is none of ours; ForbiddenError (403) when it was revoked, has
   * expired, or its station is out of service.
   */
  authenticate(presented: string): StationPrincipal {
    const parts = splitKey(presented);
    const key = parts === null ? undefined : this.byPrefix.get(parts.prefix);
    if (parts === null || key === undefined || !matchesSecret(parts.secret, key.secretHash)) {
      throw new KeyRequiredError('This API key is not known here. Check that it was copied whole.');
    }
    const now = this.now();
    if (key.revokedAt !== null)
      throw new ForbiddenError('key_revoked', 'This API key was revoked. Ask for a new one.');
    if (key.expiresAt !== null && key.expiresAt <= now) {
      throw new ForbiddenError('key_expired', 'This API key has expired. Ask for a new one.');
    }
    const station = this.register.byId(key.stationId);
    if (!station.active)
      throw new ForbiddenError('station_inactive', `The station ${station.name} is out of service.`);
    this.unsavedUses.set(key.apiKeyId, now);
    return {
      stationId: key.stationId,
      station: station.name,
      apiKeyId: key.apiKeyId,
      practice: key.practice,
    };
  }

  list(stationName: string): ApiKey[] {
    const { stationId } = this.stationNamed(stationName);
    const keys = [...this.byPrefix.values()].filter((key) => key.stationId === stationId);
    return keys.sort((a, b) => b.apiKeyId - a.apiKeyId);
  }

  lastUsedAt(key: ApiKey): number | null {
    return this.unsavedUses.get(key.apiKeyId) ?? key.lastUsedAt;
  }

  async create(
    stationName: string,
    wanted: CreateApiKeyDto,
    actor: string,
  ): Promise<{ key: string; record: ApiKey }> {
    const station = this.stationNamed(stationName);
    const expiresAt = wanted.expiresAt == null ? null : Date.parse(wanted.expiresAt);
    if (expiresAt !== null && expiresAt <= this.now()) {
      throw new InvalidError([
        { pointer: '/expiresAt', code: 'past', detail: 'Lies in the past; give a later time or null.' },
      ]);
    }
    const { key, prefix, secretHash } = createKey();
    const record = await this.writer.run(async (transaction) => {
      const created = await ApiKey.create(
        {
          stationId: station.stationId,
          prefix,
          secretHash,
          label: wanted.label,
          practice: wanted.practice,
          createdBy: actor,
          createdAt: this.now(),
          expiresAt,
          revokedAt: null,
          lastUsedAt: null,
        },
        { transaction },
      );
      await this.audit.record(transaction, {
        actor,
        action: 'apiKey.created',
        subject: `${station.name} ${prefix}`,
        detail: wanted.label,
      });
      return created;
    });
    this.byPrefix.set(prefix, record);
    return { key, record };
  }

  /** Acts at once: the next post with this key is refused. */
  async revoke(stationName: string, keyId: number, actor: string): Promise<ApiKey> {
    const record = this.list(stationName).find((key) => key.apiKeyId === keyId);
    if (record === undefined) throw new NotFoundError(`The key ${keyId} of ${stationName}`);
    if (record.revokedAt !== null) return record;
    const revokedAt = this.now();
    await this.writer.run(async (transaction) => {
      await ApiKey.update({ revokedAt }, { where: { apiKeyId: keyId }, transaction });
      await this.audit.record(transaction, {
        actor,
        action: 'apiKey.revoked',
        subject: `${stationName} ${record.prefix}`,
        detail: null,
      });
    });
    record.set({ revokedAt });
    return record;
  }

  @Interval(LAST_USE_FLUSH_MS)
  async saveLastUses(): Promise<void> {
    if (this.unsavedUses.size === 0) return;
    const uses = [...this.unsavedUses];
    this.unsavedUses.clear();
    for (const key of this.byPrefix.values()) {
      const used = uses.find(([apiKeyId]) => apiKeyId === key.apiKeyId);
      if (used !== undefined) key.set({ lastUsedAt: used[1] });
    }
    await this.writer
      .run((transaction) =>
        runStatement(
          transaction,
          `UPDATE api_keys SET last_used_at = u.at
           FROM ${listTable('?', ['id', 'at'])} AS u WHERE api_key_id = u.id`,
          JSON.stringify(uses),
        ),
      )
      .catch(() => undefined); // A lost "last used" is no loss; the next minute brings another.
  }

  private stationNamed(name: string): { stationId: number; name: string } {
    const station = this.register.byName(name);
    if (station === undefined) throw new NotFoundError(`The station "${name}"`);
    return station;
  }
}
