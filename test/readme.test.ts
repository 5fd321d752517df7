import { mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { pathToFileURL } from 'node:url';
import { describe, expect, it, vi } from 'vitest';
import { run } from '../src/cli/run.ts';
import type { World } from '../src/cli/world.ts';

const README = readFileSync('README.md', 'utf8');

const blocks = (language: string): readonly string[] =>
  [...README.matchAll(new RegExp(`^\`\`\`${language}\\n(.*?)^\`\`\`$`, 'gms'))].map((match) => match[1] ?? '');

/** The words of a shell line: quotes group, nothing else is special. */
const wordsOf = (line: string): readonly string[] =>
  [...line.matchAll(/(?:[^\s"']|"[^"]*"|'[^']*')+/g)].map(([word]) => word.replace(/["']/g, ''));

/** `printf 'TEXT' | couplet ...` feeds TEXT to standard input. */
const taken = (line: string): { readonly argv: readonly string[]; readonly input: string } => {
  const [, fed = '', command = line] = /^printf '(.*)' \| (.*)$/.exec(line) ?? [];
  const [name, ...argv] = wordsOf(command);
  if (name !== 'couplet') throw new Error(`a README command that this test does not run: ${line}`);
  return { argv, input: fed.replaceAll('\\n', '\n') };
};

const shown = async (line: string): Promise<string> => {
  const { argv, input } = taken(line);
  let text = '';
  const world: World = {
    out: (piece) => {
      text += piece;
      return Promise.resolve();
    },
    err: (piece) => {
      text += piece;
    },
    // eslint-disable-next-line @typescript-eslint/require-await
    input: (async function* () {
      yield new TextEncoder().encode(input);
    })(),
    open: () => {
      throw new Error('no README command opens a file');
    },
    terminal: false,
    colour: false,
  };
  await run(argv, world);
  return text.trimEnd();
};

const consoleCases = blocks('console').map((block) => {
  const [first = '', ...rest] = block.trimEnd().split('\n');
  return { line: first.replace(/^\$ /, ''), printed: rest.join('\n').trimEnd() };
});

describe('the README', () => {
  it('begins with one paragraph that states the job', () => {
    expect(README).toMatch(/^# Couplet\n\nCouplet turns a sketch .*\n\n## /);
  });

  it.each(consoleCases)('prints what it says for: $line', async ({ line, printed }) => {
    expect(printed).not.toBe('');
    expect(await shown(line)).toBe(printed);
  });

  it('names only npm scripts that exist', () => {
    const { scripts } = JSON.parse(readFileSync('package.json', 'utf8')) as { scripts: Record<string, string> };
    const named = [...README.matchAll(/npm run ([a-z:]+)/g)].map((match) => match[1] ?? '');
    expect(named.length).toBeGreaterThan(1);
    for (const name of named) expect(Object.keys(scripts)).toContain(name);
  });

  it.each(blocks('ts').map((code, index) => ({ code, printed: blocks('text')[index] ?? '', index })))(
    'runs its library example $index',
    async ({ code, printed, index }) => {
      mkdirSync('.reports', { recursive: true });
      const file = `.reports/readme-${String(index)}.ts`;
      writeFileSync(file, code.replace("'couplet'", "'../src/index.ts'"));
      const lines: string[] = [];
      const spy = vi.spyOn(console, 'log').mockImplementation((...words: unknown[]) => {
        lines.push(words.join(' '));
      });
      await import(/* @vite-ignore */ pathToFileURL(file).href);
      spy.mockRestore();
      expect(lines.join('\n')).toBe(printed.trimEnd());
    },
  );
});
