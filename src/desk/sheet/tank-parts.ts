import { answer } from '../answer.ts';
import { type SheetHead, type SheetTank, targetSchema } from '../schema/sheet.ts';
import type { AmountsReply, SheetFault, TargetAnswer } from './answer.ts';
import { type Path, checked, nameOf, sheetField } from './part.ts';
import { tankAsk } from './tank-ask.ts';
import { TARGET_KEYS, answerTarget } from './target.ts';
import type { SheetText } from './text.ts';

/** A tank that was read, with what its parts need to know of it. */
export interface TankContext {
  readonly sheet: SheetText;
  readonly head: SheetHead;
  readonly tank: SheetTank;
  readonly product: string;
  readonly path: Path;
}

/** What 1 kA h makes of every species; its fault where nothing follows. */
export const yieldOf = ({ sheet, head, tank, product, path }: TankContext): AmountsReply | SheetFault => {
  const given = answer(tankAsk(head, tank, product, { charge: '1 kA h' }));
  if (given.ok && given.ask === 'amounts') return given;
  if (given.ok) throw new RangeError('amounts were answered with something else');
  return { name: tank.name, fault: sheet.place(sheetField(given.fault, {}), path) };
};

/** The goals of a tank, each by itself. */
export const answerTargets = ({ sheet, head, tank, product, path }: TankContext): readonly TargetAnswer[] =>
  (tank.targets ?? []).map((value, at) => {
    const place = [...path, 'targets', at];
    const name = nameOf(value, 'label', nameOf(value, 'goal', `goal ${String(at + 1)}`));
    const target = checked(sheet, targetSchema, value, place, 'a goal');
    if (!target.ok) return { name, fault: target.fault };
    const done = answerTarget(target.value, product, (species, given) => tankAsk(head, tank, species, given));
    return done.ok ? done.value : { name, fault: sheet.place(sheetField(done.fault, TARGET_KEYS), place) };
  });
