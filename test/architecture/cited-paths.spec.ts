import { existsSync } from 'node:fs';
import { textOf } from './source-files';

const documents = ['README.md', 'DEVELOPERS.md'];
const inProject = /^(?:\.ci|jobs|migrations|server|shared|src|test)\//;
const { scripts } = JSON.parse(textOf('package.json')) as { scripts: Record<string, string> };

/** The words set as code, in a sentence or in a block. */
function codeWords(text: string): string[] {
  const spans = text.match(/```[\s\S]*?```|`[^`\n]+`/g) ?? [];
  return spans.flatMap((span) => span.replace(/`/g, ' ').split(/[\s,;()]+/));
}

describe.each(documents)('%s', (document) => {
  it('cites only paths that exist', () => {
    const cited = codeWords(textOf(document)).filter((word) => inProject.test(word) && !/[<>*{}…]/.test(word));
    expect(cited.filter((path) => !existsSync(path.replace(/[.:]$/, '')))).toEqual([]);
  });

  it('names only npm scripts that exist', () => {
    const named = [...textOf(document).matchAll(/npm run ([a-z0-9:-]+)/g)].map(([, name]) => name);
    expect(named.filter((name) => !(name in scripts))).toEqual([]);
  });
});
