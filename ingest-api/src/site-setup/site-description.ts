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
  return [
    ...repeatedPlaces(value),
    ...value.products.flatMap((product, index) => contradictions(product, `/products/${index}`)),
  ];
}

/** What must be unique over the whole file. */
function repeatedPlaces({ products, stations }: SiteDescription): ErrorPlace[] {
  const instruments = stations.flatMap(({ instruments = [] }, station) =>
    instruments.map(({ kind, serialNumber }, index) => ({
      name: `${kind} ${serialNumber}`,
      pointer: `/stations/${station}/instruments/${index}/serialNumber`,
    })),
  );
  const twice = (pointer: string, what: string): ErrorPlace => ({
    pointer,
    code: 'duplicate',
    detail: `This ${what} is described twice.`,
  });
  return [
    ...repeated(products, ({ partNumber }) => partNumber).map((index) =>
      twice(`/products/${index}/partNumber`, 'product'),
    ),
    ...repeated(stations, ({ station }) => station).map((index) =>
      twice(`/stations/${index}/station`, 'station'),
    ),
    ...repeated(instruments, ({ name }) => name).map((index) =>
      twice(instruments[index]!.pointer, 'instrument'),
    ),
  ];
}

function toPlace({ instancePath, keyword, message, params }: ErrorObject): ErrorPlace {
  const extra = (params as { additionalProperty?: string }).additionalProperty;
  return {
    pointer: instancePath,
    code: keyword,
    detail: `${message ?? 'not valid'}${extra === undefined ? '' : `: "${extra}"`}`,
  };
}

type Fault = (place: string, code: string, detail: string) => void;

function contradictions(product: DescribedProduct, pointer: string): ErrorPlace[] {
  const faults: ErrorPlace[] = [];
  const fault: Fault = (place, code, detail) => faults.push({ pointer: pointer + place, code, detail });
  if (product.complianceLowVolts >= product.complianceHighVolts) {
    fault('/complianceHighVolts', 'range', 'Must lie above complianceLowVolts.');
  }
  const { goldenUnits = [], stages } = product;
  for (const index of repeated(goldenUnits, ({ serialNumber }) => serialNumber)) {
    fault(`/goldenUnits/${index}/serialNumber`, 'duplicate', 'This golden unit is named twice.');
  }
  for (const index of repeated(stages, ({ stage }) => stage)) {
    fault(`/stages/${index}/stage`, 'duplicate', 'Two stages bear this name.');
  }
  stages.forEach((stage, index) => checkStage(product, stage, `/stages/${index}`, fault));
  return faults;
}

function checkStage(product: DescribedProduct, stage: DescribedStage, place: string, fault: Fault): void {
  const { complianceLowVolts: low, complianceHighVolts: high } = product;
  const { effectiveAt, testPlan, limits } = stage;
  if (testPlan.referenceVolts < low || testPlan.referenceVolts > high) {
    fault(
      `${place}/testPlan/referenceVolts`,
      'range',
      `Must lie in the promised range, ${low} to ${high} V.`,
    );
  }
  if (effectiveAt !== undefined && Number.isNaN(Date.parse(effectiveAt))) {
    fault(`${place}/effectiveAt`, 'time', 'Is no time that exists (a leap second perhaps).');
  }
  for (const index of repeated(limits, ({ measure }) => measure)) {
    fault(`${place}/limits/${index}/measure`, 'duplicate', 'This measure is limited twice.');
  }
  limits.forEach(({ measure, lower, upper }, index) => {
    if (lower !== undefined && upper !== undefined && lower >= upper) {
      fault(`${place}/limits/${index}`, 'range', 'lower must lie below upper.');
    }
    // Judged in conductance, 1/R: an impedance limit of zero or less has none.
    if (measure === 'outputImpedance' && Math.min(lower ?? 1, upper ?? 1) <= 0) {
      fault(`${place}/limits/${index}`, 'range', 'A limit of the output impedance must be above 0 Ω.');
    }
  });
}

/** Places of the entries that bear the name of an earlier one. */
function repeated<Entry>(entries: readonly Entry[], nameOf: (entry: Entry) => string): number[] {
  const names = entries.map(nameOf);
  return names.flatMap((name, index) => (names.indexOf(name) === index ? [] : [index]));
}
