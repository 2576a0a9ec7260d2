import { DateTime } from 'luxon';
import { breachTitle } from '../breaches/breach-words.js';
import type { Env } from '../config/env.js';
import type { BreachMailFacts, FailingUnit } from './breach-mail.queries.js';
import { html, type Html } from './html.js';
import { slopeInWords } from './slope-in-words.js';

export interface RenderedMail {
  text: string;
  html: string;
}

type Site = Pick<Env, 'publicUrl' | 'siteName' | 'timeZone'>;

const why =
  'You get this mail because your account is a quality lead. One mail is sent per breach; further fails join it.';

/** Nothing in it is fetched from anywhere; the links are built from the settings. */
export function renderBreachMail(facts: BreachMailFacts, site: Site): RenderedMail {
  return { text: renderText(facts, site), html: renderHtml(facts, site).source };
}

const breachLink = ({ breachId }: BreachMailFacts, { publicUrl }: Site): string =>
  `${publicUrl}/breaches/${breachId}`;

const unitLink = (
  { partNumber }: BreachMailFacts,
  { serialNumber, resultUuid }: FailingUnit,
  { publicUrl }: Site,
): string =>
  `${publicUrl}/units/${encodeURIComponent(partNumber)}/${encodeURIComponent(serialNumber)}?result=${resultUuid}`;

const timeIn = ({ timeZone }: Site, at: number): string =>
  DateTime.fromMillis(at, { zone: timeZone, locale: 'en-GB' }).toFormat('d LLL yyyy, HH:mm:ss ZZZZ');

function unitFacts(facts: BreachMailFacts, site: Site): [label: string, value: string][] {
  const { first } = facts;
  return [
    ['Unit', first.serialNumber],
    ...(first.lot === null ? [] : ([['Lot', first.lot]] as [string, string][])),
    ['Product', facts.partNumber],
    ['Stage', facts.stage],
    ['Station', first.station],
    ['Tested', timeIn(site, first.startedAt)],
  ];
}

function countText({ eventCount }: BreachMailFacts): string {
  const more = eventCount - 1;
  return more === 0
    ? ''
    : `${more} more ${more === 1 ? 'result' : 'results'} joined this breach before this mail went out.`;
}

function renderText(facts: BreachMailFacts, site: Site): string {
  const { first, others } = facts;
  const lines = [
    breachTitle(facts.measure, facts.partNumber, facts.stage),
    '',
    first.text,
    slopeInWords(first),
    '',
    ...unitFacts(facts, site).map(([label, value]) => `${label}: ${oneLine(value)}`),
    '',
    `Open the breach: ${breachLink(facts, site)}`,
    `See the unit's curve: ${unitLink(facts, first, site)}`,
    '',
    ...(others.length === 0
      ? []
      : [countText(facts), ...others.map((unit) => `- ${oneLine(unit.serialNumber)}: ${unit.text}`), '']),
    '-- ',
    `${site.siteName}, Ampkeep. ${why}`,
  ];
  return `${lines.join('\n')}\n`;
}

/** Line breaks in a station's text must not look like lines of ours. */
const oneLine = (text: string): string => text.replace(/\s+/g, ' ');

const styles = `
  :root { color-scheme: light dark; }
  body { margin: 0; padding: 16px; background: #FCFDF8; color: #1E2A2F; font: 16px/1.45 system-ui, sans-serif; }
  main { max-width: 36em; }
  h1 { margin: 0 0 12px; font-size: 20px; line-height: 1.25; }
  p { margin: 0 0 12px; }
  table { border-collapse: collapse; margin: 0 0 16px; }
  th { padding: 3px 16px 3px 0; font-weight: normal; text-align: left; color: #566369; vertical-align: top; }
  td { padding: 3px 0; overflow-wrap: anywhere; }
  a { color: #A84B12; }
  footer { border-top: 1px solid #D3D6CB; padding-top: 12px; font-size: 14px; color: #566369; }
  @media (prefers-color-scheme: dark) {
    body { background: #1A2226; color: #E9E4D8; }
    th, footer { color: #A3ADB0; }
    a { color: #E08A4C; }
    footer { border-color: #2E393E; }
  }`;

function renderHtml(facts: BreachMailFacts, site: Site): Html {
  const { first } = facts;
  const title = breachTitle(facts.measure, facts.partNumber, facts.stage);
  const rows = unitFacts(facts, site).map(
    ([label, value]) =>
      html`<tr>
        <th scope="row">${label}</th>
        <td>${value}</td>
      </tr>`,
  );
  return html`<!doctype html>
    <html lang="en">
      <head>
        <meta charset="utf-8" />
        <meta name="viewport" content="width=device-width, initial-scale=1" />
        <title>${title}</title>
        <style>
          ${styles}
        </style>
      </head>
      <body>
        <main>
          <h1>${title}</h1>
          <p>${first.text}</p>
          <p>${slopeInWords(first)}</p>
          <table>
            ${rows}
          </table>
          <p><a href="${breachLink(facts, site)}">Open the breach</a></p>
          <p><a href="${unitLink(facts, first, site)}">See the unit's curve</a></p>
          ${othersHtml(facts, site)}
          <footer>${site.siteName}, Ampkeep. ${why}</footer>
        </main>
      </body>
    </html> `;
}

function othersHtml(facts: BreachMailFacts, site: Site): Html {
  if (facts.others.length === 0) return html``;
  const items = facts.others.map(
    (unit) => html`<li><a href="${unitLink(facts, unit, site)}">${unit.serialNumber}</a>: ${unit.text}</li>`,
  );
  return html`<p>${countText(facts)} The latest:</p>
    <ul>
      ${items}
    </ul>`;
}
