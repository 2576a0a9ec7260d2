import { mkdtempSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Env } from '../config/env.js';
import { MailboxFiles } from './mailbox-files.js';

const aMail = (overrides: { to?: string; subject?: string } = {}): Buffer =>
  Buffer.from(
    [
      'From: Ampkeep <ampkeep@fernhollow.example>',
      `To: ${overrides.to ?? 'Quality@fernhollow.example'}`,
      `Subject: ${overrides.subject ?? 'a breach'}`,
      'Message-ID: <breach-1@fernhollow.example>',
      'Content-Type: text/html; charset=utf-8',
      '',
      '<p>12.1 MΩ</p>',
      '',
    ].join('\r\n'),
  );

describe('MailboxFiles', () => {
  let dataDir: string;
  let now: number;
  beforeEach(() => {
    dataDir = mkdtempSync(join(tmpdir(), 'ampkeep-mailbox-'));
    now = Date.parse('2026-11-30T08:00:00Z');
  });
  afterEach(() => rmSync(dataDir, { recursive: true }));

  const openFiles = async (): Promise<MailboxFiles> => {
    const files = new MailboxFiles({ dataDir } as Env, () => now++);
    await files.open();
    return files;
  };

  it('keeps a mail and reads it back', async () => {
    const files = await openFiles();
    const mailId = await files.keep(aMail());
    expect(files.list()).toEqual([
      {
        mailId,
        to: ['quality@fernhollow.example'],
        from: '"Ampkeep" <ampkeep@fernhollow.example>',
        subject: 'a breach',
        receivedAt: Date.parse('2026-11-30T08:00:00Z'),
        messageId: '<breach-1@fernhollow.example>',
      },
    ]);
    expect((await files.read(mailId))?.html).toContain('<p>12.1 MΩ</p>');
  });

  it('lists the newest first, and after a restart the same', async () => {
    const files = await openFiles();
    await files.keep(aMail({ subject: 'older' }));
    await files.keep(aMail({ subject: 'newer' }));
    const again = await openFiles();
    expect(files.list().map(({ subject }) => subject)).toEqual(['newer', 'older']);
    expect(again.list()).toEqual(files.list());
  });

  it('passes over files that are none of its own', async () => {
    await openFiles();
    writeFileSync(join(dataDir, 'mailbox', '1796025342010-9f86d081884c.eml.part'), 'half');
    writeFileSync(join(dataDir, 'mailbox', 'notes.eml'), 'x');
    expect((await openFiles()).list()).toEqual([]);
  });

  it('reads nothing by an id that it did not give', async () => {
    const files = await openFiles();
    expect(await files.read('../ampkeep')).toBeNull();
  });

  it('lets the oldest make room beyond 500', async () => {
    const files = await openFiles();
    for (let count = 0; count < 502; count += 1) await files.keep(aMail({ subject: `mail ${count}` }));
    expect(files.list()).toHaveLength(500);
    expect(files.list().at(-1)?.subject).toBe('mail 2');
    expect(readdirSync(join(dataDir, 'mailbox'))).toHaveLength(500);
  });
});
