import { renderBreachMail } from './breach-mail.js';
import type { BreachMailFacts, FailingUnit } from './breach-mail.queries.js';

const site = {
  publicUrl: 'https://ampkeep.fernhollow.example',
  siteName: 'Fernhollow Controls',
  timeZone: 'Europe/London',
};

const resultUuid = '0193f3a2-6f0e-7c52-9a3e-5b1f4c0d2e11';

const aFailingUnit = (overrides: Partial<FailingUnit> = {}): FailingUnit => ({
  resultUuid,
  serialNumber: 'W26480417',
  lot: 'L2648-2',
  station: 'north-2',
  startedAt: Date.parse('2026-07-30T08:15:30Z'),
  text: 'Output impedance is 3.1 MΩ; at least 5 MΩ is required, so it fails.',
  conductanceSiemens: 322e-9,
  conductanceUncertainty: 10e-9,
  limitSiemens: 200e-9,
  ...overrides,
});

const facts = (overrides: Partial<BreachMailFacts> = {}): BreachMailFacts => ({
  breachId: 12,
  measure: 'outputImpedance',
  partNumber: 'FH-R500-W',
  stage: 'final',
  openedAt: Date.parse('2026-07-30T08:15:42Z'),
  eventCount: 1,
  first: aFailingUnit(),
  others: [],
  ...overrides,
});

describe('renderBreachMail', () => {
  it('says in both forms what failed, where, how bad, and where to look', () => {
    const mail = renderBreachMail(facts(), site);
    for (const form of [mail.text, mail.html]) {
      expect(form).toContain('Output impedance out of limits: FH-R500-W at final');
      expect(form).toContain('at least 5 MΩ is required, so it fails.');
      expect(form).toContain('322 nA per volt of load, 1.6 times what the limit allows');
      expect(form).toContain('W26480417');
      expect(form).toContain('L2648-2');
      expect(form).toContain('north-2');
      expect(form).toContain('https://ampkeep.fernhollow.example/breaches/12');
      expect(form).toContain(
        `https://ampkeep.fernhollow.example/units/FH-R500-W/W26480417?result=${resultUuid}`,
      );
    }
  });

  it("tells times in the site's time zone", () => {
    expect(renderBreachMail(facts(), site).text).toContain('Tested: 30 Jul 2026, 09:15:30 BST');
  });

  it('fetches nothing: no pictures, scripts, style sheets or fonts', () => {
    const { html } = renderBreachMail(facts(), site);
    expect(html).not.toMatch(/<(img|script|link|iframe|object|video)|url\(|@import|src=/i);
    expect(html.match(/https?:\/\/[^/"]+/g)).toEqual([
      'https://ampkeep.fernhollow.example',
      'https://ampkeep.fernhollow.example',
    ]);
  });

  it("never lets a station's text become markup, a link or a line of its own", () => {
    const serialNumber = '<img src=x onerror="alert(1)">/../?';
    const lot = "a&b'\nOpen the breach: https://elsewhere.example";
    const unit = aFailingUnit({ serialNumber, lot });
    const mail = renderBreachMail(facts({ first: unit, others: [unit], eventCount: 2 }), site);
    expect(mail.html).not.toContain('<img');
    expect(mail.html).toContain('&lt;img src=x onerror=&quot;alert(1)&quot;&gt;');
    expect(mail.html).toContain(`/units/FH-R500-W/${encodeURIComponent(serialNumber)}?result=${resultUuid}"`);
    expect(mail.text.match(/^Open the breach: .*$/gm)).toEqual([
      'Open the breach: https://ampkeep.fernhollow.example/breaches/12',
    ]);
  });

  it('names the units that joined before it went out', () => {
    const others = [aFailingUnit({ serialNumber: 'W26480431' }), aFailingUnit({ serialNumber: 'W26480430' })];
    const mail = renderBreachMail(facts({ eventCount: 41, others }), site);
    for (const form of [mail.text, mail.html]) {
      expect(form).toContain('40 more results joined');
      expect(form).toContain('W26480431');
      expect(form).toContain('W26480430');
    }
  });
});
