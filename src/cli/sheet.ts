import { answerSheet } from '../desk/sheet.ts';
import type { SheetAnswer, SheetFault, TankAnswer } from '../desk/sheet.ts';
import { renderFault } from '../render/fault.ts';
import type { Look } from '../render/look.ts';
import { renderCautions, renderFoot, renderHead, renderTank } from '../render/sheet.ts';
import { lookFor } from './look.ts';
import type { Showing } from './outcome.ts';
import { type ExitCode, type World, textOf } from './world.ts';

/** Every fault of a sheet, those of runs under their tank. */
const faultsOf = (tank: TankAnswer): readonly SheetFault[] => {
  if ('fault' in tank) return [tank];
  const runs = tank.runs.flatMap((run) =>
    'fault' in run ? [{ name: `${tank.name}, ${run.name}`, fault: run.fault }] : [],
  );
  return 'fault' in tank.yield ? [tank.yield, ...runs] : runs;
};

const showPages = async (sheet: SheetAnswer, text: string, look: Look, world: World): Promise<void> => {
  await world.out(`${renderHead(sheet, look)}\n`);
  for (const tank of sheet.tanks) {
    if (!('fault' in tank)) await world.out(`${renderTank(tank, look)}\n`);
    for (const { name, fault } of faultsOf(tank)) world.err(`${name}\n${renderFault(fault, text, look)}\n`);
  }
  const cautions = renderCautions(sheet, look);
  if (cautions !== '') await world.out(`${cautions}\n`);
  await world.out(renderFoot(sheet));
};

/** Answers a sheet and shows it; exit code 1 where anything in it is at fault. */
export const showSheet = async (path: string, showing: Showing, world: World): Promise<ExitCode> => {
  const text = await textOf(world, path);
  const read = answerSheet(text);
  const look = lookFor(world, showing.plain);
  if (!read.ok) {
    if (showing.json === true) await world.out(`${JSON.stringify({ contract: 1, ok: false, fault: read.fault })}\n`);
    else world.err(renderFault(read.fault, text, look));
    return 1;
  }
  if (showing.json === true) await world.out(`${JSON.stringify({ contract: 1, ok: true, sheet: read.value })}\n`);
  else await showPages(read.value, text, look, world);
  return read.value.tanks.some((tank) => faultsOf(tank).length > 0) ? 1 : 0;
};
