import { createSourceFile, forEachChild, isIdentifier, isNewExpression, isPropertyAccessExpression } from 'typescript';
import { type Node, ScriptTarget } from 'typescript';
import { filesIn, importsOf, textOf } from './source-files';

const files = filesIn('shared').filter((file) => /(?<!\.spec|\.d)\.ts$/.test(file));

const globalsOfAHost = new Set(
  'window document navigator location localStorage sessionStorage fetch process Buffer global globalThis require console performance crypto setTimeout setInterval setImmediate queueMicrotask TextDecoder TextEncoder URL'.split(
    ' ',
  ),
);
const clockAndChance = /^(Date\.now|Math\.random)$/;

/** Names of a host, of the clock and of chance that the file uses. */
function impuritiesOf(file: string): string[] {
  const found: string[] = [];
  const declared = new Set<string>();
  const source = createSourceFile(file, textOf(file), ScriptTarget.ES2022, true);

  function visit(node: Node): void {
    if ('name' in node && !isPropertyAccessExpression(node))
      declared.add((node.name as Node | undefined)?.getText() ?? '');
    if (isPropertyAccessExpression(node) && clockAndChance.test(node.getText())) found.push(node.getText());
    if (isNewExpression(node) && node.expression.getText() === 'Date' && !node.arguments?.length)
      found.push('new Date()');
    if (isIdentifier(node) && globalsOfAHost.has(node.text) && isReading(node)) found.push(node.text);
    forEachChild(node, visit);
  }

  visit(source);
  return found.filter((name) => !declared.has(name)).map((name) => `${file} uses ${name}`);
}

/** False for the `location` of `trace.location` and of `{ location: 3 }`, which are no globals. */
function isReading(node: Node): boolean {
  const parent = node.parent as Node & { name?: Node };
  return parent.name !== node;
}

it('finds the files it judges', () => {
  expect(files.length).toBeGreaterThan(20);
});

it('imports nothing of Node.js', () => {
  const targets = files.flatMap(importsOf).filter(({ target }) => target.startsWith('node:'));
  expect(targets).toEqual([]);
});

it('uses no global of a browser or of Node.js, no clock and no chance', () => {
  expect(files.flatMap(impuritiesOf)).toEqual([]);
});
