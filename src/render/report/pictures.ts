import type { Quantity } from '../../desk/schema/shape.ts';
import type { WholeRun, WholeTank } from '../../desk/sheet/answer.ts';
import { escaped, formulaHtml } from '../markup.ts';
import { PICTURE_WIDTH, bandText, electrodeBand } from '../svg/band.ts';
import { CHART_HEIGHT, type Making, recordChart } from '../svg/chart.ts';
import { picture } from '../svg/element.ts';

/** The hatching of what is not accounted for: used by every picture, so that it stands on the page once. */
export const PATTERNS =
  '<svg class="hidden" aria-hidden="true" width="0" height="0"><defs>' +
  '<pattern id="hatch" width="5" height="5" patternUnits="userSpaceOnUse" patternTransform="rotate(45)">' +
  '<rect width="5" height="5" fill="#fff" style="stroke:none"/><line x1="0" y1="0" x2="0" y2="5" stroke="#5b6770" stroke-width="2"/>' +
  '</pattern></defs></svg>';

/** Where the current of a tank went: a band of shares for each electrode. */
export const bandFigure = ({ name, currentUse, product }: WholeTank): string => {
  const cathode = electrodeBand('cathode', currentUse.cathode, 0);
  const anode = electrodeBand('anode', currentUse.anode, cathode.height + 10);
  const title = `${name}, where the current went. Cathode: ${bandText(currentUse.cathode)}. Anode: ${bandText(currentUse.anode)}.`;
  const height = cathode.height + 10 + anode.height;
  const basis =
    currentUse.measured === null
      ? 'Shares as the reactions are written.'
      : `Share of ${formulaHtml(product)} by the efficiency of the runs; the other electrode as its reactions are written.`;
  return (
    `<figure><h3>Where the current went</h3>${picture(title, PICTURE_WIDTH, height, cathode.markup + anode.markup)}` +
    `<figcaption>${basis}</figcaption></figure>`
  );
};

/** The mass of the product for each unit of charge, where both are known. */
const makingOf = (run: WholeRun): Making | null => {
  const { mass, charge }: { mass?: Quantity; charge?: Quantity } = run.amounts.answer.quantities;
  if (mass === undefined || charge === undefined || charge.value === 0) return null;
  return { species: run.product, unit: mass.unit, perCharge: mass.value / charge.value };
};

const recordFigure = (run: WholeRun, tank: WholeTank): string => {
  if (run.record === null || run.record.trace.length < 2) return '';
  const making = makingOf(run);
  const mass =
    making === null ? '' : ` The mass of ${formulaHtml(run.product)} follows the charge at the efficiency of the run.`;
  const title = `${tank.name}, ${run.name}: charge${making === null ? '' : ' and mass'} over time, and the current below.`;
  const chart = picture(title, PICTURE_WIDTH, CHART_HEIGHT, recordChart(run.record.trace, making));
  return (
    `<figure><h3>${escaped(run.name)}: charge${making === null ? '' : ' and mass'} over time</h3>${chart}` +
    `<figcaption>From ${escaped(run.record.path)}.${mass}</figcaption></figure>`
  );
};

/** A chart of charge, mass and current over time for each run with a record. */
export const recordFigures = (tank: WholeTank): string =>
  tank.runs.map((run) => ('fault' in run ? '' : recordFigure(run, tank))).join('');
