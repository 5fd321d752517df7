import { type Result, all, chain, failure, inField, success } from '../../report/result.ts';
import { readSpecies } from '../../species/read.ts';
import { gasCautionsOfCell, hazardsOfCell } from '../cautions.ts';
import { composeFields } from '../electrodes.ts';
import { readAsk } from '../read-ask.ts';
import type { ShownCaution } from '../schema/shape.ts';
import { readSettings } from '../settings.ts';
import { cellOf, commonOf } from './tank-ask.ts';
import type { TankContext } from './tank-parts.ts';

/**
 * The cautions of a tank: its reactions, the species that are only there, what drives it. What its gases come to for
 * each ampere is left out where the runs tell it (`gasKnown`). Faults: of reading, in `present[i]`.
 */
export const tankCautions = ({ head, tank }: TankContext, gasKnown: boolean): Result<readonly ShownCaution[]> =>
  chain(readAsk({ ask: 'cell', ...cellOf(tank), ...commonOf(head) }), (ask) =>
    chain(readSettings(ask), (options) => {
      if (ask.ask !== 'cell' || !('anode' in ask)) return failure({ code: 'bad-ask', message: 'This is no cell.' });
      const present = (tank.present ?? []).map((text, at) =>
        inField(readSpecies(text, options), `present[${String(at)}]`),
      );
      return chain(all(present), (read) =>
        chain(composeFields(ask, options), (cell) => {
          const besides = { mode: tank.mode ?? 'electrolysis', present: read.map(({ species }) => species) } as const;
          const hazards = hazardsOfCell(cell, ask.separator ?? null, besides);
          return success(gasKnown ? hazards : [...hazards, ...gasCautionsOfCell(cell)]);
        }),
      );
    }),
  );
