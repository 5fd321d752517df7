import { spawnSync } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { answerSheet } from '../../src/desk/sheet/sheet.ts';
import { reportHtml } from '../../src/render/report/html.ts';

/** HTML Tidy of the HTACG, where the machine has it: its own reading of what HTML allows. */
const tidy = (page: string): { readonly status: number | null; readonly said: string } => {
  const { status, stderr } = spawnSync('tidy', ['-quiet', '-errors', '-utf8'], { input: page, encoding: 'utf8' });
  return { status, said: stderr };
};

const isThere = spawnSync('tidy', ['-version']).error === undefined;

describe('the report, by an HTML checker of others', () => {
  it.skipIf(!isThere).each(['fixtures/tern-quay.yaml', 'fixtures/sheets/hostile.yaml'])(
    'has no error and no warning: %s (skipped where tidy is not installed)',
    (path) => {
      const text = readFileSync(path, 'utf8');
      const sheet = answerSheet(text);
      if (!sheet.ok) throw new Error(sheet.fault.message);
      expect(tidy(reportHtml(sheet.value, text))).toEqual({ status: 0, said: '' });
    },
  );

  it.skipIf(!isThere)('would be refused if it were broken (skipped where tidy is not installed)', () => {
    expect(tidy('<!DOCTYPE html><title>x</title><p><b>a</p>').status).not.toBe(0);
  });
});
