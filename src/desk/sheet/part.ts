import type * as z from 'zod';
import type { Fault } from '../../report/fault.ts';
import { type Result, failure, success } from '../../report/result.ts';
import { foremost, issueFault } from '../issue.ts';
import { fieldsOf } from '../read-ask.ts';
import type { SheetText } from './text.ts';

/** Where a part of a sheet stands: ["cells", 1, "runs", 0]. */
export type Path = readonly PropertyKey[];

/** A part of the sheet against its schema; the fault is placed in the sheet. */
export const checked = <T>(
  sheet: SheetText,
  schema: z.ZodType<T> & { readonly shape: object },
  value: unknown,
  path: Path,
  where: string,
): Result<T> => {
  const parsed = schema.safeParse(value);
  if (parsed.success) return success(parsed.data);
  const fault = issueFault(foremost(parsed.error.issues), Object.keys(schema.shape), where);
  return failure(sheet.place(fault, path));
};

/** The name of a part that may be broken, for its heading. */
export const nameOf = (value: unknown, key: 'name' | 'label' | 'goal', fallback: string): string => {
  const name = fieldsOf(value)?.[key];
  return typeof name === 'string' && name !== '' ? name : fallback;
};

/**
 * The fields of an amounts ask as the sheet calls them: `given.current` is `current`, `species` is `product`; `renamed`
 * says under which key a quantity stands in this part of the sheet: a run weighs its `mass`.
 */
export const sheetField = (fault: Fault, renamed: Readonly<Record<string, string>>): Fault => {
  const [first = '', ...rest] = (fault.field ?? '').replace(/^given\.?/, '').split('.');
  const key = first === 'species' ? 'product' : (renamed[first] ?? first);
  return { ...fault, field: [key, ...rest].join('.') };
};
