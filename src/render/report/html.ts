import { ABSENCE } from '../../caution/cautions.ts';
import type { SheetAnswer, SheetCaution, TankAnswer } from '../../desk/sheet/answer.ts';
import { escaped, formulaHtml } from '../markup.ts';
import { PATTERNS } from './pictures.ts';
import { REPORT_STYLE } from './style.ts';
import { tankSection } from './tank.ts';
import { REPORT_WRITING, faultHtml } from './words.ts';
import { graveOf, makesGas, othersOf } from '../sheet/cautions.ts';
import { tankSummary } from '../sheet/summary.ts';
import { GAS_BASIS, totalRows } from '../sheet/words.ts';

const cautionItem = (caution: SheetCaution): string => {
  const basis = [caution.because.map(formulaHtml).join(', '), escaped(caution.basis)].filter((part) => part !== '');
  return (
    `<li><span class="where">${caution.tanks.map(escaped).join(', ')}.</span> ${escaped(caution.text)} ` +
    `<span class="basis">${basis.join('; ')}</span></li>`
  );
};

const graveSection = (sheet: SheetAnswer): string => {
  const grave = graveOf(sheet);
  if (grave.length === 0) return '';
  return `<section class="grave" aria-labelledby="first"><h2 id="first">Read first</h2><ul>${grave.map(cautionItem).join('')}</ul></section>`;
};

const otherSection = (sheet: SheetAnswer): string => {
  const others = othersOf(sheet);
  const list = others.length === 0 ? '' : `<ul>${others.map(cautionItem).join('')}</ul>`;
  return (
    `<section class="tank others" aria-labelledby="cautions"><h2 id="cautions">Cautions</h2>${list}` +
    `<p class="basis">${makesGas(sheet) ? `${escaped(GAS_BASIS)}<br>` : ''}${escaped(ABSENCE)}</p></section>`
  );
};

const glanceCell = (heading: string, cell: string): string =>
  cell === '' ? '<td class="none"></td>' : `<td data-of="${heading}">${cell}</td>`;

const glanceRow = (tank: TankAnswer, at: number): string => {
  if ('fault' in tank) {
    const empty = '<td class="none"></td>'.repeat(3);
    return `<tr><td>${escaped(tank.name)}</td>${empty}<td><span class="alarm">not answered</span></td></tr>`;
  }
  const { product, made, charge, efficiency, alarms } = tankSummary(tank, REPORT_WRITING);
  const link = `<a href="#tank${String(at + 1)}">${escaped(tank.name)}</a>`;
  const remark = alarms.map((alarm) => `<span class="alarm">${alarm}</span>`).join('<br>');
  const cells = [
    glanceCell('made', made === '' ? '' : `${made} ${product}`),
    glanceCell('charge', charge),
    glanceCell('efficiency', efficiency),
    remark === '' ? '<td class="none"></td>' : `<td>${remark}</td>`,
  ];
  return `<tr><td>${link}</td>${cells.join('')}</tr>`;
};

const glanceSection = (sheet: SheetAnswer): string => {
  const sums = totalRows(sheet.totals, REPORT_WRITING).map(({ name, value, aside }) => {
    const small = aside === '' ? '' : `<span class="basis">${escaped(aside)}</span>`;
    return `<li><span class="what">${name}</span>${escaped(value)}${small}</li>`;
  });
  return [
    '<section aria-labelledby="glance"><h2 id="glance">At a glance</h2>',
    sheet.totals.runs === 0 ? '' : `<ul class="sum">${sums.join('')}</ul>`,
    '<table class="rows glance"><thead><tr><th scope="col">tank</th><th scope="col">made</th>',
    '<th scope="col">charge</th><th scope="col">efficiency</th><th scope="col"><span class="basis">to look at</span></th></tr></thead>',
    `<tbody>${sheet.tanks.map(glanceRow).join('')}</tbody></table></section>`,
  ].join('\n');
};

const tankPart = (tank: TankAnswer, at: number, sheetText: string): string =>
  'fault' in tank
    ? `<section class="tank"><h2 id="tank${String(at + 1)}">${escaped(tank.name)}</h2>${faultHtml(tank.name, tank.fault, sheetText)}</section>`
    : tankSection(tank, at, sheetText);

const invented = ({ plant }: SheetAnswer): string => `${escaped(plant)} and all its figures are invented.`;

/**
 * A sheet's answers as one HTML page that needs nothing else: style and pictures are in it, no script, no link that
 * leaves it. Grave cautions come first. Everything that the sheet says is escaped. `sheetText` is shown where a part is
 * at fault.
 */
export const reportHtml = (sheet: SheetAnswer, sheetText: string): string => {
  const about = sheet.about === null ? '' : `<p>${escaped(sheet.about)}</p>`;
  return `${[
    '<!DOCTYPE html>',
    '<html lang="en">',
    '<head>',
    '<meta charset="utf-8">',
    '<meta name="viewport" content="width=device-width, initial-scale=1">',
    `<title>${escaped(sheet.plant)}</title>`,
    `<style>${REPORT_STYLE}</style>`,
    '</head>',
    '<body>',
    PATTERNS,
    `<main><header><h1>${escaped(sheet.plant)}</h1>${about}${sheet.invented ? `<p>${invented(sheet)}</p>` : ''}</header>`,
    graveSection(sheet),
    glanceSection(sheet),
    ...sheet.tanks.map((tank, at) => tankPart(tank, at, sheetText)),
    otherSection(sheet),
    `<footer>${sheet.invented ? `${invented(sheet)} ` : ''}Amounts by Faraday's law with the atomic weights of IUPAC 2021 (abridged); ± is one standard uncertainty.</footer>`,
    '</main>',
    '</body>',
    '</html>',
  ]
    .filter((part) => part !== '')
    .join('\n')}\n`;
};
