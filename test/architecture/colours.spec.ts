import { filesIn, textOf } from './source-files';

/** `#fff` or `#a1b2c3` where a colour can stand: after a quote, a colon, a comma or a bracket; not the `#ref` of a template. */
const colour = /(?:["'`(,]\s*|:\s*)#(?:[0-9a-f]{3,4}|[0-9a-f]{6}|[0-9a-f]{8})\b|\b(?:rgb|rgba|hsl|hsla|oklch)\(\s*\d/gi;
const comment = /\/\*[\s\S]*?\*\/|^\s*\/\/.*$|<!--[\s\S]*?-->/gm;

it('names colours in the theme only', () => {
  const styled = filesIn('src').filter(
    (file) => /(?<!\.spec)\.(ts|html|scss)$/.test(file) && !file.startsWith('src/theme/'),
  );
  const found = styled.flatMap((file) =>
    (textOf(file).replace(comment, '').match(colour) ?? []).map((text) => `${file}: ${text}`),
  );
  expect(found).toEqual([]);
});
