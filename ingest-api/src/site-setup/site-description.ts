import type { ErrorObject } from 'ajv/dist/2020.js';
import type { CircuitKind, Limit, MeasureName } from '../analysis/analysis.types.js';
import { createAjv } from '../common/create-ajv.js';
import type { ErrorPlace } from '../common/errors.js';
import schema from './site.schema.json';

export interface DescribedLimit {
  measure: MeasureName;
  lower?: number;
  upper?: number;
  rule?: Limit['rule'];
  guardFactor?: number;
  adequacyRatio?: number;
}

export interface DescribedStage {
  stage: string;
  maxAttempts: number;
  yieldTarget?: number;
  effectiveAt?: string;
  testPlan: {
    loadVolts: number[];
    referenceVolts: number;
    dwellMs?: number;
    repeatFirst?: boolean;
    upAndDown?: boolean;
  };
  limits: DescribedLimit[];
}

export interface DescribedProduct {
  partNumber: string;
  description: string;
  nominalAmps: number;
  supplyVolts: number;
  complianceLowVolts: number;
  complianceHighVolts: number;
  complianceTolerance: number;
  direction: 'source' | 'sink';
  circuitKind: CircuitKind;
  hasEmitterResistors?: boolean;
  goldenUnits?: { serialNumber: string; checkHours: number }[];
  stages: DescribedStage[];
}

export interface DescribedStation {
  station: string;
  line: string;
  instruments?: {
    kind: 'ammeter' | 'voltmeter';
    serialNumber: string;
    model?: string;
    range?: number;
    resolution?: number;
    readingAccuracyPercent?: number;
    rangeAccuracyPercent?: number;
    calibrationDueOn?: string;
  }[];
}

/** A site file that holds against site.schema.json, which stays the source of truth. */
export interface SiteDescription {
  products: DescribedProduct[];
  stations: DescribedStation[];
}

const check = createAjv().compile<SiteDescription>(schema);

/** Where a site file breaks its schema or contradicts itself; none means that it can be applied. */
export function findSiteFaults(value: unknown): ErrorPlace[] {
  if (!check(value)) return (check.errors ?? []).map(toPlace);
  return value.products.flatMap((product, index) => contradictions(product, `/products/${index}`));
}

function toPlace({ instancePath, keyword, message, params }: ErrorObject): ErrorPlace {
  const extra = (params as { additionalProperty?: string }).additionalProperty;
  return {
    pointer: instancePath,
    code: keyword,
    detail: `${message ?? 'not valid'}${extra === undefined ? '' : `: "${extra}"`}`,
  };
}

function contradictions(product: DescribedProduct, pointer: string): ErrorPlace[] {
  const { complianceLowVolts: low, complianceHighVolts: high } = product;
  const faults: ErrorPlace[] = [];
  if (low >= high)
    faults.push({
      pointer: `${pointer}/complianceHighVolts`,
      code: 'range',
      detail: 'Must lie above complianceLowVolts.',
    });
  product.stages.forEach((stage, index) => {
    const at = `${pointer}/stages/${index}`;
    const { referenceVolts } = stage.testPlan;
    if (referenceVolts < low || referenceVolts > high) {
      faults.push({
        pointer: `${at}/testPlan/referenceVolts`,
        code: 'range',
        detail: `Must lie in the promised range, ${low} to ${high} V.`,
      });
    }
    if (product.stages.findIndex((other) => other.stage === stage.stage) !== index) {
      faults.push({ pointer: `${at}/stage`, code: 'duplicate', detail: 'Two stages bear this name.' });
    }
    stage.limits.forEach((limit, place) => {
      if (limit.lower !== undefined && limit.upper !== undefined && limit.lower >= limit.upper) {
        faults.push({
          pointer: `${at}/limits/${place}`,
          code: 'range',
          detail: 'lower must lie below upper.',
        });
      }
      if (stage.limits.findIndex((other) => other.measure === limit.measure) !== place) {
        faults.push({
          pointer: `${at}/limits/${place}/measure`,
          code: 'duplicate',
          detail: 'This measure is limited twice.',
        });
      }
    });
  });
  return faults;
}
