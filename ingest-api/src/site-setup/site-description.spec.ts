import { aProduct, aSite } from '../../test/builders.js';
import { findSiteFaults, type SiteDescription } from './site-description.js';

const placesOf = (site: unknown): string[] =>
  findSiteFaults(site).map(({ pointer, code }) => `${pointer} ${code}`);
const withProduct = (overrides: Parameters<typeof aProduct>[0]): SiteDescription => ({
  ...aSite(),
  products: [aProduct(overrides)],
});
const [board, final] = aProduct().stages;

describe('a site file', () => {
  it('without fault has none', () => {
    expect(findSiteFaults(aSite())).toEqual([]);
    expect(findSiteFaults({ products: [], stations: [] })).toEqual([]);
  });

  it.each<[string, unknown, string[]]>([
    ['nothing', null, [' type']],
    ['a list', [], [' type']],
    ['half a file', { products: [] }, [' required']],
    ['a misspelt name', { ...aSite(), station: [] }, [' additionalProperties']],
    [
      'a product upside down',
      withProduct({ complianceHighVolts: -1 }),
      ['/products/0/complianceHighVolts range'],
    ],
    ['no stage', withProduct({ stages: [] }), ['/products/0/stages minItems']],
    [
      'two stages of one name',
      withProduct({ stages: [board!, board!] }),
      ['/products/0/stages/1/stage duplicate'],
    ],
    [
      'a reference outside the promised range',
      withProduct({ stages: [{ ...board!, testPlan: { loadVolts: [0, 1, 2], referenceVolts: 8.1 } }] }),
      ['/products/0/stages/0/testPlan/referenceVolts range'],
    ],
    [
      'load steps given twice',
      withProduct({ stages: [{ ...board!, testPlan: { loadVolts: [0, 1, 1], referenceVolts: 1 } }] }),
      ['/products/0/stages/0/testPlan/loadVolts uniqueItems'],
    ],
    [
      'a limit that limits nothing',
      withProduct({ stages: [{ ...board!, limits: [{ measure: 'setpointError' }] }] }),
      ['/products/0/stages/0/limits/0 required'],
    ],
    [
      'a limit upside down',
      withProduct({ stages: [{ ...board!, limits: [{ measure: 'setpointError', lower: 1, upper: 1 }] }] }),
      ['/products/0/stages/0/limits/0 range'],
    ],
    [
      'a measure limited twice',
      withProduct({ stages: [board!, { ...final!, limits: [board!.limits[0]!, board!.limits[0]!] }] }),
      ['/products/0/stages/1/limits/1/measure duplicate'],
    ],
    [
      'an impedance limit of nothing',
      withProduct({ stages: [{ ...board!, limits: [{ measure: 'outputImpedance', lower: 0 }] }] }),
      ['/products/0/stages/0/limits/0 range'],
    ],
    [
      'a leap second',
      withProduct({ stages: [{ ...board!, effectiveAt: '2016-12-31T23:59:60Z' }] }),
      ['/products/0/stages/0/effectiveAt time'],
    ],
    [
      'a golden unit named twice',
      withProduct({ goldenUnits: [1, 2].map((checkHours) => ({ serialNumber: 'G', checkHours })) }),
      ['/products/0/goldenUnits/1/serialNumber duplicate'],
    ],
    [
      'a product described twice',
      { products: [aProduct(), aProduct()], stations: [] },
      ['/products/1/partNumber duplicate'],
    ],
    [
      'a station described twice',
      { products: [], stations: [1, 2].map((line) => ({ station: 'north-1', line: `line ${line}` })) },
      ['/stations/1/station duplicate'],
    ],
    [
      'an instrument on two stations',
      {
        products: [],
        stations: ['a', 'b'].map((station) => ({
          station,
          line: 'x',
          instruments: [{ kind: 'ammeter', serialNumber: '1' }],
        })),
      },
      ['/stations/1/instruments/0/serialNumber duplicate'],
    ],
    [
      'a station name that fits no address',
      { products: [], stations: [{ station: 'North 1', line: 'x' }] },
      ['/stations/0/station pattern'],
    ],
    [
      'a part number that is a step up',
      withProduct({ partNumber: '..' }),
      ['/products/0/partNumber pattern'],
    ],
  ])('with %s names the place', (_, site, places) => {
    expect(placesOf(site)).toEqual(expect.arrayContaining(places));
  });

  it('tells all its faults at once', () => {
    expect(
      placesOf(withProduct({ complianceHighVolts: -1, stages: [board!, board!] })).length,
    ).toBeGreaterThanOrEqual(3);
  });
});
