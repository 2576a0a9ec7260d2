import type { ModelCtor } from 'sequelize-typescript';
import { ApiKey } from '../api-keys/models/api-key.model.js';
import { AuditEntry } from '../audit/models/audit-entry.model.js';
import { BreachEvent } from '../breaches/models/breach-event.model.js';
import { Breach } from '../breaches/models/breach.model.js';
import { RefusedPost } from '../intake/models/refused-post.model.js';
import { OutboxMail } from '../mail/models/outbox-mail.model.js';
import { GoldenUnit } from '../products/models/golden-unit.model.js';
import { LimitSet } from '../products/models/limit-set.model.js';
import { Product } from '../products/models/product.model.js';
import { Stage } from '../products/models/stage.model.js';
import { TestPlan } from '../products/models/test-plan.model.js';
import { Lot } from '../results/models/lot.model.js';
import { ResultBody } from '../results/models/result-body.model.js';
import { Result } from '../results/models/result.model.js';
import { Unit } from '../results/models/unit.model.js';
import { Heartbeat } from '../stations/models/heartbeat.model.js';
import { Instrument } from '../stations/models/instrument.model.js';
import { Station } from '../stations/models/station.model.js';
import { Session } from '../users/models/session.model.js';
import { User } from '../users/models/user.model.js';

/** Every table that is read or written through Sequelize. */
export const models: ModelCtor[] = [
  ApiKey,
  AuditEntry,
  Breach,
  BreachEvent,
  GoldenUnit,
  Heartbeat,
  Instrument,
  LimitSet,
  Lot,
  OutboxMail,
  Product,
  RefusedPost,
  Result,
  ResultBody,
  Session,
  Stage,
  Station,
  TestPlan,
  Unit,
  User,
];
