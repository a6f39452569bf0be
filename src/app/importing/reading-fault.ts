import type { Problem } from '@shared/contracts/problem';
import { adviceOn } from '../ui/problem';
import { type TagName, tagWords } from './tag-words';

export interface ReadingFault {
  /** "Line 214, column 2"; empty when the fault is not in one place. */
  readonly place: string;
  /** Line of the file, from 1, to show it. */
  readonly line: number | null;
  readonly found: string;
  readonly expected: string;
  /** What happened, where it is not said by place, found and expected. */
  readonly happened: string;
  readonly advice: string;
}

/** A problem of a file in the parts that a person looks for: where, what was found, what was expected, what to do. */
export function readingFault(problem: Problem): ReadingFault {
  const { line, column, found = '', expected = '' } = problem;
  const places = [line && `line ${line}`, column && `column ${column}`].filter(Boolean).join(', ');
  const fault = { place: capital(places), line: line ?? null, advice: adviceOn(problem) };
  if (problem.type === '/problems/unreadable' && found !== '') return { ...fault, found, expected, happened: '' };
  const isContradiction = problem.type === '/problems/contradiction';
  return {
    ...fault,
    found: '',
    expected: '',
    happened: inWords(problem.detail),
    advice:
      fault.advice || (isContradiction ? 'Correct the tag, or leave it to the file, and import the file again.' : ''),
  };
}

/** "rbwHz: the file says ..." begins with the name of a tag in the interface; people call it something else. */
function inWords(detail: string): string {
  return capital(detail.replace(/^(\w+)(?=: )/, (name) => tagWords(name as TagName)));
}

function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}

export interface ExcerptLine {
  readonly number: number;
  readonly text: string;
}

const LINES_AROUND = 2;
const LONGEST_LINE = 160;

/** The lines of a file around one of them. */
export function excerptAround(text: string, line: number): ExcerptLine[] {
  const first = Math.max(1, line - LINES_AROUND);
  return text
    .split(/\r\n|\n|\r/)
    .slice(first - 1, line + LINES_AROUND)
    .map((content, place) => ({ number: first + place, text: content.slice(0, LONGEST_LINE) }));
}
