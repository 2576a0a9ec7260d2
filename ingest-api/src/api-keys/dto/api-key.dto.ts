import type { ApiKey } from '../models/api-key.model.js';

const isoOrNull = (time: number | null): string | null =>
  time === null ? null : new Date(time).toISOString();

export class ApiKeyDto {
  /** @example 3 */
  keyId!: number;
  /**
   * The public part, by which the key can be told.
   * @example "k7m2p9qx"
   */
  prefix!: string;
  label!: string;
  practice!: boolean;
  state!: 'active' | 'expired' | 'revoked';
  createdAt!: string;
  createdBy!: string;
  expiresAt!: string | null;
  revokedAt!: string | null;
  lastUsedAt!: string | null;
}

export class CreatedApiKeyDto extends ApiKeyDto {
  /**
   * The whole key. It is shown this once and kept nowhere.
   * @example "amk_k7m2p9qx_6tR0…"
   */
  key!: string;
}

export function toApiKeyDto(key: ApiKey, lastUsedAt: number | null, now: number): ApiKeyDto {
  const expired = key.expiresAt !== null && key.expiresAt <= now;
  return {
    keyId: key.apiKeyId,
    prefix: key.prefix,
    label: key.label,
    practice: key.practice,
    state: key.revokedAt !== null ? 'revoked' : expired ? 'expired' : 'active',
    createdAt: new Date(key.createdAt).toISOString(),
    createdBy: key.createdBy,
    expiresAt: isoOrNull(key.expiresAt),
    revokedAt: isoOrNull(key.revokedAt),
    lastUsedAt: isoOrNull(lastUsedAt),
  };
}
