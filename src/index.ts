export { answer } from './desk/answer.ts';
export { type ReadSheet, answerReadSheet, answerSheet, readSheet } from './desk/sheet/sheet.ts';
export type { NamedRecord, Records } from './desk/sheet/record.ts';
export { type SheetAnswer, type RunAnswer, type TankAnswer, type SheetFault } from './desk/sheet/answer.ts';
export { type Ask, type AskKind, type AskOf, askSchema } from './desk/schema/ask.ts';
export { type Answer, type Answered, type Faulted, answerSchema } from './desk/schema/answer.ts';
export { type Published, publishedSchema } from './desk/schema/published.ts';
export { type WallEntryAnswer, type WallLine, type WallSettings, answerWall } from './desk/wall.ts';
export type { Fault, FaultCode } from './report/fault.ts';
