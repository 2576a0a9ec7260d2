import { randomUUID } from 'node:crypto';
import type { INestApplicationContext } from '@nestjs/common';
import { Op, type Transaction } from 'sequelize';
import type { MeasureJudgement, MeasureName } from '../src/analysis/analysis.types.js';
import { BreachRecorder, type FailedResult, type RecordedBreach } from '../src/breaches/breach-recorder.js';
import { BreachEvent } from '../src/breaches/models/breach-event.model.js';
import { Breach } from '../src/breaches/models/breach.model.js';
import { roles } from '../src/auth/roles.js';
import { OutboxMail } from '../src/mail/models/outbox-mail.model.js';
import { Outbox } from '../src/mail/outbox.js';
import { User } from '../src/users/models/user.model.js';
import { emailOf, startOfTest, type TestApp } from './create-test-app.js';
import { Writer } from '../src/database/writer.js';
import { Result } from '../src/results/models/result.model.js';
import { Unit } from '../src/results/models/unit.model.js';

/** A failing result of the product of `aSite()`; its stages are `board` (1) and `final` (2). */
export interface FailWish {
  serialNumber: string;
  stageId: number;
  receivedAt: number;
  startedAt: number;
  seeded: boolean;
  failedMeasures: MeasureName[];
}

export const aJudgement = (name: MeasureName): MeasureJudgement => ({
  name,
  unit: 'Ω',
  value: 3.1e6,
  expandedUncertainty: 1e5,
  low: 3e6,
  high: 3.2e6,
  bound: 'exact',
  reason: null,
  limit: { measure: name, lower: 5e6, upper: null, rule: 'guarded', guardFactor: 1 },
  outcome: 'fail',
  probabilityOfConformity: 0,
});

const aFail: Omit<FailWish, 'receivedAt' | 'startedAt'> = {
  serialNumber: 'W26480417',
  stageId: 2,
  seeded: false,
  failedMeasures: ['outputImpedance'],
};

/** Stores failing results received `now` in one transaction with their breaches, as intake does. */
export async function storeFails(
  app: INestApplicationContext,
  now: number,
  wishes: readonly Partial<FailWish>[],
): Promise<RecordedBreach[]> {
  const recorder = app.get(BreachRecorder, { strict: false });
  const recorded = await app.get(Writer).run(async (transaction) => {
    const fails: FailedResult[] = [];
    for (const wish of wishes) {
      fails.push(
        await storeResult(transaction, { ...aFail, receivedAt: now, startedAt: now - 12_000, ...wish }),
      );
    }
    return recorder.record(transaction, fails);
  });
  recorder.afterCommit(recorded);
  return recorded;
}

/** Back to a line without breaches and mails, with the accounts of `createTestApp` alone. */
export async function clearBreaches({ app, clock }: TestApp): Promise<void> {
  // A delivery that a breach started on its own would otherwise run on into the next test.
  await app.get(Outbox).deliverDue();
  clock.now = startOfTest;
  await app.get(Writer).run(async (transaction) => {
    await OutboxMail.destroy({ where: {}, transaction });
    await BreachEvent.destroy({ where: {}, transaction });
    await Breach.destroy({ where: {}, transaction });
    await User.destroy({ where: { email: { [Op.notIn]: roles.map(emailOf) } }, transaction });
  });
}

async function storeResult(transaction: Transaction, wish: FailWish): Promise<FailedResult> {
  const { serialNumber, ...fields } = wish;
  const known = await Unit.findOne({ where: { serialNumber }, transaction });
  const { unitId } = known ?? (await Unit.create({ productId: 1, serialNumber }, { transaction }));
  const judgement = wish.failedMeasures.map(aJudgement);
  const resultUuid = randomUUID();
  const { resultId } = await Result.create(
    { ...aResultRow, ...fields, resultUuid, unitId, judgement },
    { transaction },
  );
  const stage = wish.stageId === 1 ? 'board' : 'final';
  return { ...wish, resultId, resultUuid, judgement, partNumber: 'FH-R500-W', stage };
}

const aResultRow = {
  stationId: 1,
  productId: 1,
  runKind: 'production',
  outcome: 'completed',
  counted: true,
  attempt: 1,
  verdict: 'fail',
  firstVerdict: 'fail',
  conductanceSiemens: 322e-9,
  conductanceUncertainty: 1e-8,
  limitSiemens: 2e-7,
  impedanceOhms: 3.1e6,
  impedanceBound: 'exact',
  referenceAmps: 5e-4,
  flags: [],
  answer: {},
};
