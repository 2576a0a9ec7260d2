import type {
  DescribedProduct,
  DescribedStation,
  SiteDescription,
} from '@ampkeep/ingest-api/dist/site-setup/site-description.js';
import { goldenUnitOf } from '@ampkeep/station-sim/dist/circuit/golden-units.js';
import { ammeterOnRange, voltmeter } from '@ampkeep/station-sim/dist/circuit/instruments.js';
import type { ProductFacts } from '@ampkeep/station-sim/dist/circuit/product-facts.js';
import { products } from '@ampkeep/station-sim/dist/circuit/products.js';
import { stations, type StationFacts } from '@ampkeep/station-sim/dist/circuit/stations.js';
import { GOLDEN_CHECK_HOURS } from './line.js';
import { limitsOf } from './limits.js';

const DAY_MS = 86_400_000;

/** Days from now to the calibration of each station's meters, in the stations' order; one is soon due. */
const calibrationInDays = [142, 215, 88, 9, 176, 301];

/** Fernhollow Controls as a site file: what `npm run setup` would be given. */
export function describeSite(now: Date, effectiveAt: Date): SiteDescription {
  return {
    products: products.map((product) => describeProduct(product, effectiveAt)),
    stations: stations.map((station, index) => describeStation(station, dueOn(now, index))),
  };
}

function describeProduct(product: ProductFacts, effectiveAt: Date): DescribedProduct {
  const { partNumber, description, nominalAmps, supplyVolts, direction, circuitKind } = product;
  return {
    partNumber,
    description,
    nominalAmps,
    supplyVolts,
    complianceLowVolts: product.complianceLowVolts,
    complianceHighVolts: product.complianceHighVolts,
    complianceTolerance: product.complianceTolerance,
    direction,
    circuitKind,
    hasEmitterResistors: product.hasEmitterResistors,
    goldenUnits: [{ serialNumber: goldenUnitOf(partNumber).serialNumber, checkHours: GOLDEN_CHECK_HOURS }],
    stages: product.stages.map((stage) => ({
      stage: stage.stage,
      maxAttempts: stage.maxAttempts,
      yieldTarget: stage.yieldTarget,
      effectiveAt: effectiveAt.toISOString(),
      testPlan: {
        loadVolts: [...stage.testPlan.loadVolts],
        referenceVolts: stage.testPlan.referenceVolts,
        dwellMs: stage.testPlan.dwellMs,
        repeatFirst: stage.testPlan.repeatFirst,
        upAndDown: stage.testPlan.upAndDown,
      },
      limits: limitsOf(stage).map(({ measure, lower, upper, rule, guardFactor }) => ({
        measure,
        ...(lower === null ? {} : { lower }),
        ...(upper === null ? {} : { upper }),
        rule,
        guardFactor,
      })),
    })),
  };
}

function describeStation(facts: StationFacts, calibrationDueOn: string): DescribedStation {
  const ammeter = ammeterOnRange({ serialNumber: facts.ammeterSerialNumber, gainError: 0 }, 0.001);
  const volts = voltmeter(facts.voltmeterSerialNumber, 0);
  return {
    station: facts.station,
    line: facts.line,
    instruments: [
      {
        kind: 'ammeter',
        serialNumber: ammeter.serialNumber,
        range: ammeter.rangeAmps,
        resolution: ammeter.resolutionAmps,
        readingAccuracyPercent: ammeter.readingAccuracyPercent,
        rangeAccuracyPercent: ammeter.rangeAccuracyPercent,
        calibrationDueOn,
      },
      {
        kind: 'voltmeter',
        serialNumber: volts.serialNumber,
        range: volts.rangeVolts,
        resolution: volts.resolutionVolts,
        readingAccuracyPercent: volts.readingAccuracyPercent,
        rangeAccuracyPercent: volts.rangeAccuracyPercent,
        calibrationDueOn,
      },
    ],
  };
}

function dueOn(now: Date, index: number): string {
  const days = calibrationInDays[index % calibrationInDays.length] ?? 0;
  return new Date(now.getTime() + days * DAY_MS).toISOString().slice(0, 10);
}
