import { existsSync, readFileSync, readdirSync, statSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { preProcessFile } from 'typescript';

export interface Import {
  /** Path from the top of the project, as `server/app.ts`. */
  file: string;
  /** A project path like `file`, or the name of a package as written, as `node:path`. */
  target: string;
  isPackage: boolean;
  /** True when the file takes nothing but types from there. */
  isTypeOnly: boolean;
}

const typeOnlyImport = /^import (?:type [^;']*|\{(?:\s*type \w+,?)+\s*\}) from '[^']+';/gm;

/** Every file below the folders, as paths from the top of the project. */
export function filesIn(...folders: string[]): string[] {
  return folders.flatMap((folder) =>
    readdirSync(folder, { withFileTypes: true }).flatMap((entry) => {
      const path = join(folder, entry.name);
      return entry.isDirectory() ? filesIn(path) : [path];
    }),
  );
}

/** The product's own TypeScript, without its specs. */
export function sourceFiles(): string[] {
  return filesIn('shared', 'server', 'jobs', 'src').filter((file) => /(?<!\.spec|\.d)\.ts$/.test(file));
}

export function textOf(file: string): string {
  return readFileSync(file, 'utf8');
}

/** What a file imports, exports again or loads lazily. */
export function importsOf(file: string): Import[] {
  const values = specifiersIn(textOf(file).replace(typeOnlyImport, ''));
  return specifiersIn(textOf(file)).map((specifier) => {
    const path = projectPath(file, specifier);
    const isTypeOnly = !values.includes(specifier);
    return { file, target: path ?? specifier, isPackage: path === undefined, isTypeOnly };
  });
}

function specifiersIn(text: string): string[] {
  return preProcessFile(text, true, true).importedFiles.map(({ fileName }) => fileName);
}

function projectPath(file: string, specifier: string): string | undefined {
  if (!/^\.|^@shared\//.test(specifier)) return undefined;
  const path = specifier.startsWith('@shared/')
    ? specifier.replace('@shared/', 'shared/')
    : join(dirname(file), specifier);
  const candidates = [path, `${path}.ts`, `${path}.d.ts`, join(path, 'index.ts')];
  return candidates.find((candidate) => existsSync(candidate) && statSync(candidate).isFile()) ?? path;
}
