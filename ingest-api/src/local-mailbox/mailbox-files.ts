import { randomBytes } from 'node:crypto';
import { mkdir, readdir, readFile, rename, rm, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { Inject, Injectable } from '@nestjs/common';
import { type AddressObject, type ParsedMail, simpleParser } from 'mailparser';
import { CLOCK, type Clock, ENV } from '../config/config.module.js';
import type { Env } from '../config/env.js';

/** What a list shows of a mail. */
export interface KeptMail {
  mailId: string;
  to: string[];
  from: string;
  subject: string;
  receivedAt: number;
  messageId: string;
}

/** Beyond this the oldest make room. */
const MOST_KEPT = 500;

const ID_PATTERN = /^(\d{13})-[0-9a-f]{12}$/;
const FILE_ENDING = '.eml';

/** Mails as files in `mailbox/` of the data folder, as they came; a small index of them in memory. */
@Injectable()
export class MailboxFiles {
  private readonly folder: string;
  private readonly index = new Map<string, KeptMail>();

  constructor(
    @Inject(ENV) env: Env,
    @Inject(CLOCK) private readonly clock: Clock,
  ) {
    this.folder = join(env.dataDir, 'mailbox');
  }

  /** Reads what an earlier run kept. */
  async open(): Promise<void> {
    await mkdir(this.folder, { recursive: true, mode: 0o700 });
    const mailIds = (await readdir(this.folder))
      .filter((name) => name.endsWith(FILE_ENDING))
      .map((name) => name.slice(0, -FILE_ENDING.length))
      .filter((name) => ID_PATTERN.test(name))
      .sort();
    for (const mailId of mailIds)
      this.index.set(mailId, kept(mailId, await parse(await readFile(this.path(mailId)))));
  }

  /** @returns the id it is found by; grows with time. */
  async keep(source: Buffer): Promise<string> {
    const mailId = `${String(this.clock()).padStart(13, '0')}-${randomBytes(6).toString('hex')}`;
    const mail = kept(mailId, await parse(source));
    const unfinished = `${this.path(mailId)}.part`;
    await writeFile(unfinished, source, { mode: 0o600 });
    await rename(unfinished, this.path(mailId));
    this.index.set(mailId, mail);
    await this.makeRoom();
    return mailId;
  }

  /** Newest first. */
  list(): KeptMail[] {
    return [...this.index.values()].reverse();
  }

  /** The whole mail, or null when there is none of that id. */
  async read(mailId: string): Promise<{ mail: KeptMail; text: string; html: string | null } | null> {
    const mail = this.index.get(mailId);
    if (mail === undefined) return null;
    const parsed = await parse(await readFile(this.path(mailId)));
    return { mail, text: parsed.text ?? '', html: parsed.html || null };
  }

  private path(mailId: string): string {
    return join(this.folder, `${mailId}${FILE_ENDING}`);
  }

  private async makeRoom(): Promise<void> {
    const surplus = [...this.index.keys()].slice(0, Math.max(0, this.index.size - MOST_KEPT));
    for (const mailId of surplus) {
      this.index.delete(mailId);
      await rm(this.path(mailId), { force: true });
    }
  }
}

const parse = (source: Buffer): Promise<ParsedMail> =>
  simpleParser(source, { skipTextToHtml: true, skipImageLinks: true, skipTextLinks: true });

function kept(mailId: string, mail: ParsedMail): KeptMail {
  return {
    mailId,
    to: addresses(mail.to),
    from: mail.from?.text ?? '',
    subject: mail.subject ?? '',
    receivedAt: Number(ID_PATTERN.exec(mailId)![1]),
    messageId: mail.messageId ?? '',
  };
}

function addresses(field: AddressObject | AddressObject[] | undefined): string[] {
  const groups = field === undefined ? [] : Array.isArray(field) ? field : [field];
  return groups.flatMap(({ value }) =>
    value.flatMap(({ address }) => (address ? [address.toLowerCase()] : [])),
  );
}
