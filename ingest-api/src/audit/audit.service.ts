import { Inject, Injectable } from '@nestjs/common';
import { Op, type Transaction } from 'sequelize';
import { CLOCK, type Clock } from '../config/config.module.js';
import { AuditEntry } from './models/audit-entry.model.js';

export interface Deed {
  /** Mail address of the person, or `system`. */
  actor: string;
  /** Dotted, e.g. `apiKey.created`. */
  action: string;
  /** What it was done to. */
  subject: string;
  detail: string | null;
}

/** The trail of who did what; the database refuses to change or remove its rows. */
@Injectable()
export class AuditService {
  constructor(@Inject(CLOCK) private readonly clock: Clock) {}

  /** Part of the deed's own transaction: neither is stored without the other. */
  async record(transaction: Transaction, deed: Deed): Promise<void> {
    await AuditEntry.create({ ...deed, at: this.clock() }, { transaction });
  }

  /** Newest first, from below `beforeId`; one entry more than the page holds says that there is a next one. */
  findPage(beforeId: number | null, pageSize: number): Promise<AuditEntry[]> {
    return AuditEntry.findAll({
      where: beforeId === null ? {} : { auditEntryId: { [Op.lt]: beforeId } },
      order: [['auditEntryId', 'DESC']],
      limit: pageSize + 1,
    });
  }
}
