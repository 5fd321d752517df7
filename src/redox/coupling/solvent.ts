import type { Unknown } from '../../balance/unknowns.ts';
import { HYDROXIDE, PROTON, WATER } from '../media.ts';

/** Water and its ions, and what else the medium lends; water also where no medium lends it but the text writes it. */
export const isSolvent = ({ species, helper }: Unknown): boolean =>
  helper || [WATER, PROTON, HYDROXIDE].some(({ key }) => key === species.key);
