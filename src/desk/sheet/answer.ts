import type { Fault } from '../../report/fault.ts';
import type { Answer } from '../schema/answer.ts';
import type { Quantity, ShownCaution } from '../schema/shape.ts';

export type CellReply = Extract<Answer, { readonly ok: true; readonly ask: 'cell' }>;
export type AmountsReply = Extract<Answer, { readonly ok: true; readonly ask: 'amounts' }>;

/** A part of a sheet that could not be answered; the fault is placed in the sheet's text. */
export interface SheetFault {
  readonly name: string;
  readonly fault: Fault;
}

/** What one input contributes to the uncertainty of a current efficiency. */
export interface BudgetShare {
  /** The field of the run, "weighed" or "current"; or "atomic weight of Cu". */
  readonly input: string;
  /** Standard uncertainty that it brings to the efficiency, in percentage points. */
  readonly contribution: number;
  /** Its part of the variance, 0 to 1. */
  readonly part: number;
}

/** A current efficiency found by weighing: in %, with one standard uncertainty and what it is made of. */
export interface Efficiency {
  readonly efficiency: Quantity;
  /** The largest contribution first. */
  readonly budget: readonly BudgetShare[];
}

/** The weighing of one run; `standsOut` says in a sentence why its result is doubtful, null where it is not. */
export interface WeighedRun extends Efficiency {
  readonly standsOut: string | null;
}

/** The weighed runs of a tank together: total mass over the mass that the total charge could have made. */
export interface WeighedTank extends Efficiency {
  /** How many runs were weighed. */
  readonly runs: number;
  /** The same without the runs that stand out; null where none does, or where none is left. */
  readonly without: Efficiency | null;
}

/** A stretch of a record for a picture: s from its start, the least and greatest A, net A h at its end. */
export interface TraceStretch {
  readonly from: number;
  readonly to: number;
  readonly least: number;
  readonly greatest: number;
  readonly charge: number;
}

/** What a logged current came to. */
export interface RecordedRun {
  /** As the sheet names it. */
  readonly path: string;
  readonly rows: number;
  readonly time: Quantity;
  readonly charge: Quantity;
  /** Present where some current flowed backwards: both directions apart. */
  readonly reversed?: { readonly forward: Quantity; readonly reverse: Quantity };
  /** What the reader of the record must know, by line. */
  readonly remarks: readonly string[];
  readonly trace: readonly TraceStretch[];
}

/** One run: what it makes of every species, or its fault. */
export type RunAnswer =
  | SheetFault
  | {
      readonly name: string;
      readonly note: string | null;
      /** The species that the efficiency and the weighing are about. */
      readonly product: string;
      readonly amounts: AmountsReply;
      readonly weighed: WeighedRun | null;
      readonly record: RecordedRun | null;
    };

/** A goal of a tank: what it takes, and whether it is reached. */
export type TargetAnswer =
  | SheetFault
  | {
      readonly name: string;
      readonly species: string;
      readonly goal: { readonly quantity: string; readonly text: string };
      readonly start: string | null;
      readonly by: string | null;
      /** Time that the stated current needs; null where no current is stated. */
      readonly needed: Quantity | null;
      readonly current: Quantity | null;
      /** When the stated current is done: "13:12", "02:30, 1 day later"; null without a start. */
      readonly ready: string | null;
      /** The latest start that still reaches it, where none is stated. */
      readonly latest: string | null;
      readonly reached: boolean | null;
      /** Time left at the end, negative where it is missing. */
      readonly spare: Quantity | null;
      /** The current that makes it from start to end. */
      readonly enough: Quantity | null;
      /** True where no efficiency was stated and 100 % was taken. */
      readonly assumed: boolean;
    };

/** A part of an electrode's current: to a reaction by its product, or `null` to what the sheet does not name. */
export interface CurrentPart {
  readonly species: string | null;
  readonly share: number;
}

/** Where the current of both electrodes went. `measured`: at the electrode of the product, from its efficiency. */
export interface CurrentUse {
  readonly anode: readonly CurrentPart[];
  readonly cathode: readonly CurrentPart[];
  readonly measured: 'anode' | 'cathode' | null;
}

/** Mass, amount and, for a gas with its conditions stated, volume of one product. */
export interface ProductTotal {
  readonly species: string;
  readonly mass?: Quantity;
  readonly amount?: Quantity;
  readonly volume?: Quantity;
}

/** Sums over runs. Energy counts the runs whose voltage is stated, `withoutVoltage` the others. */
export interface Totals {
  readonly runs: number;
  readonly charge: Quantity;
  readonly energy: Quantity | null;
  readonly withoutVoltage: number;
  readonly products: readonly ProductTotal[];
}

/** The fastest rate at which a tank makes a gas, by its runs; for hydrogen with the air that dilutes it. An estimate. */
export interface GasRate {
  readonly species: string;
  readonly run: string;
  readonly rate: Quantity;
  readonly air: Quantity | null;
}

/** A caution with the tanks that call for it. */
export interface SheetCaution extends ShownCaution {
  readonly tanks: readonly string[];
  /** The text without its condition, and the condition: "in a closed vessel"; null where it holds as it stands. */
  readonly says: string;
  readonly when: string | null;
}

/** One tank: its cell reaction, the yield of a stated charge, its runs and goals; or its fault. */
export type TankAnswer =
  | SheetFault
  | {
      readonly name: string;
      readonly purpose: string | null;
      readonly product: string;
      /** Species that are there and take no part. */
      readonly present: readonly string[];
      readonly cautions: readonly ShownCaution[];
      readonly cell: CellReply;
      /** What 1 kA h makes: electrons per mole of each species. */
      readonly yield: AmountsReply | SheetFault;
      readonly runs: readonly RunAnswer[];
      readonly targets: readonly TargetAnswer[];
      readonly currentUse: CurrentUse;
      readonly weighed: WeighedTank | null;
      readonly gas: readonly GasRate[];
      readonly totals: Totals;
    };

export type WholeTank = Exclude<TankAnswer, { readonly fault: unknown }>;
export type WholeRun = Exclude<RunAnswer, { readonly fault: unknown }>;
export type WholeTarget = Exclude<TargetAnswer, { readonly fault: unknown }>;

/** A plant: its tanks in the order of the sheet. */
export interface SheetAnswer {
  readonly plant: string;
  readonly about: string | null;
  /** True where the sheet says that its figures are invented. */
  readonly invented: boolean;
  /** Of all tanks, each once, the gravest first. */
  readonly cautions: readonly SheetCaution[];
  readonly totals: Totals;
  readonly tanks: readonly TankAnswer[];
}
