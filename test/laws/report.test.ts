import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { answerSheet } from '../../src/desk/sheet/sheet.ts';
import { renderHead, renderTank } from '../../src/render/sheet/sheet.ts';
import { PLAIN_LOOK } from '../../src/render/look.ts';
import { reportHtml } from '../../src/render/report/html.ts';
import { sheetCsv } from '../../src/render/sheet/csv.ts';
import { activeParts, markupProblem } from '../support/markup.ts';

/** Names as nobody would write them: any code points, and pieces of markup. */
const name = fc
  .array(
    fc.oneof(
      fc.string({ unit: 'binary', maxLength: 6 }),
      fc.constantFrom(
        '<script>',
        '</style>',
        '-->',
        '"',
        "'",
        '&amp;',
        '<',
        '\u202e',
        '\u001b[2J',
        ']]>',
        '|',
        '\n',
        'a',
      ),
    ),
    { minLength: 1, maxLength: 6 },
  )
  .map((pieces) => `n${pieces.join('')}`);

/** JSON is YAML; what YAML does not take as a character is written as an escape. */
const quoted = (text: string): string =>
  JSON.stringify(text).replace(/[\u007f-\uffff]/g, (unit) => `\\u${unit.charCodeAt(0).toString(16).padStart(4, '0')}`);

const sheetText = (names: readonly string[]): string => {
  const [plant = '', about = '', tank = '', purpose = '', run = '', note = '', goal = '', broken = ''] =
    names.map(quoted);
  return `plant: ${plant}
about: ${about}
cells:
  - name: ${tank}
    purpose: ${purpose}
    medium: acid
    anode: [Cl^- -> Cl2(g)]
    cathode: [Cu^2+ -> Cu]
    runs:
      - { label: ${run}, charge: 100 A h, weighed: 0.2 kg, note: ${note} }
      - { label: ${broken}, charge: ${broken} }
    targets: [{ label: ${goal}, goal: 1 kg by 09:00, start: 08:00, current: 2 A }]
`;
};

describe('whatever a sheet is called', () => {
  it('its report is well-formed, runs nothing, and its text moves no cursor', () => {
    fc.assert(
      fc.property(fc.array(name, { minLength: 8, maxLength: 8 }), (names) => {
        const text = sheetText(names);
        const sheet = answerSheet(text);
        if (!sheet.ok) throw new Error(sheet.fault.message);
        const page = reportHtml(sheet.value, text);
        expect(markupProblem(page)).toBe('');
        expect(activeParts(page)).toEqual([]);
        const [tank] = sheet.value.tanks;
        if (tank === undefined || 'fault' in tank) throw new Error('the tank was not answered');
        const shown = renderHead(sheet.value, PLAIN_LOOK) + renderTank(tank, PLAIN_LOOK);
        expect(shown).not.toMatch(/[\u0000-\u0009\u000b-\u001f\u007f-\u009f\u202a-\u202e\u2066-\u2069]/);
        expect(sheetCsv(sheet.value).endsWith('\n')).toBe(true);
      }),
      { numRuns: 60, seed: 20_260_504 },
    );
  });
});
