import { findSiteFaults } from '@ampkeep/ingest-api/dist/site-setup/site-description.js';
import { describe, expect, it } from 'vitest';
import { describeSite } from './site-description.js';

const site = describeSite(new Date('2026-12-01T12:00:00Z'), new Date('2026-10-02T12:00:00Z'));

describe('the demonstration’s site', () => {
  it('is one that the setup takes', () => {
    expect(findSiteFaults(site)).toEqual([]);
  });

  it('has the products and stations of Fernhollow Controls', () => {
    expect(site.products.map(({ partNumber }) => partNumber)).toEqual([
      'FH-R500-M',
      'FH-R500-W',
      'FH-T250-C',
      'FH-B15K-A',
    ]);
    expect(site.stations.map(({ station, line }) => `${line} ${station}`)).toEqual([
      'north north-1',
      'north north-2',
      'north north-3',
      'north north-4',
      'south south-1',
      'south south-2',
    ]);
  });

  it('limits output impedance on every stage, and has a golden unit for every product', () => {
    for (const { stages, goldenUnits } of site.products) {
      expect(goldenUnits).toHaveLength(1);
      for (const { limits } of stages)
        expect(limits.map(({ measure }) => measure)).toContain('outputImpedance');
    }
  });
});
