import { Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { Sequelize } from 'sequelize-typescript';
import { neighbours } from '../products/catalogue.js';
import { CatalogueService } from '../products/catalogue.service.js';
import { Lot } from '../results/models/lot.model.js';
import { Unit } from '../results/models/unit.model.js';
import type { UnitRouteDto } from './dto/unit-route.dto.js';
import { findUnitStages } from './units.queries.js';

type RouteFacts = Omit<UnitRouteDto, 'mayBeTested' | 'reason'>;

/** Tells a station whether the unit in its fixture belongs there. */
@Injectable()
export class UnitRoutesService {
  constructor(
    @InjectConnection() private readonly sequelize: Sequelize,
    private readonly catalogue: CatalogueService,
  ) {}

  /** A unit never seen before is no fault: it may begin at the first stage. */
  async route(partNumber: string, serialNumber: string, stageName: string): Promise<UnitRouteDto> {
    const { product, stage } = this.catalogue.stageNamed(partNumber, stageName);
    const unit = await Unit.findOne({ where: { productId: product.productId, serialNumber } });
    const [states, lot] = await Promise.all([
      unit === null ? [] : findUnitStages(this.sequelize, [unit.unitId]),
      unit?.lotId == null ? null : Lot.findByPk(unit.lotId),
    ]);
    const { prior } = neighbours(product, stage);
    const own = states.find((state) => state.stageId === stage.stageId);
    const before = states.find((state) => state.stageId === prior?.stageId);
    const attempts = own?.attempts ?? 0;
    const facts: RouteFacts = {
      partNumber,
      serialNumber,
      stage: stageName,
      attempts,
      attemptsLeft: Math.max(0, stage.maxAttempts - attempts),
      latestVerdict: own?.verdict ?? null,
      priorStage: prior?.name ?? null,
      priorStagePassed: prior === null ? null : before?.verdict === 'pass',
      lotHeld: lot?.state === 'held',
    };
    const reason = reasonAgainst(facts);
    return { ...facts, mayBeTested: reason === null, reason };
  }
}

/** Why the unit shall not be tested here now, the weightiest reason first; null when it may. */
function reasonAgainst(facts: RouteFacts): string | null {
  const { lotHeld, priorStage, priorStagePassed, latestVerdict, attemptsLeft, attempts, stage } = facts;
  if (lotHeld) return 'Its lot is held.';
  if (priorStagePassed === false) return `It has not passed ${priorStage}.`;
  if (latestVerdict === 'pass') return `It has passed ${stage} already.`;
  if (attemptsLeft === 0) return `It has had all its ${attempts} attempts at ${stage}.`;
  return null;
}
