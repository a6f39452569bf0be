import * as z from 'zod';
import { patchOf } from './patch-of';
import { ProductPatch } from './products';

describe('patchOf', () => {
  const Whole = z.object({ name: z.string().min(1), notes: z.string().default('') });

  it('leaves out what the change leaves out, defaults too', () => {
    expect(patchOf(Whole).parse({})).toEqual({});
    expect(ProductPatch.parse({ name: 'Charger' })).toEqual({ name: 'Charger' });
  });

  it('still checks what is given', () => {
    expect(patchOf(Whole).safeParse({ name: '' }).success).toBe(false);
    expect(patchOf(Whole).parse({ notes: 'new' })).toEqual({ notes: 'new' });
  });
});
