import { HttpErrorResponse } from '@angular/common/http';
import { adviceOn, problemOf } from './problem';

it('takes the problem details a server sent as they are', () => {
  const problem = { type: '/problems/conflict', title: 'Conflict', status: 409, detail: 'bench-1 exists already.' };
  expect(problemOf(new HttpErrorResponse({ status: 409, error: problem }))).toEqual(problem);
  // What conflicts stands in the server's own words; there is no advice that fits every conflict.
  expect(adviceOn(problem)).toBe('');
  expect(adviceOn({ ...problem, advice: 'Choose another name.' })).toBe('Choose another name.');
});

it('says so when the server did not answer, and when it answered something else', () => {
  expect(problemOf(new HttpErrorResponse({ status: 0 })).detail).toBe('The server could not be reached.');
  expect(problemOf(new HttpErrorResponse({ status: 502, error: '<html>' })).detail).toContain('502');
});

it('does not swallow faults that are no answers of a server', () => {
  expect(() => problemOf(new TypeError('undefined is no function'))).toThrow(TypeError);
});
