import * as z from 'zod';

type WithoutDefault<Field> = Field extends z.ZodDefault<infer Inner> ? Inner : Field;

/**
 * The schema of a partial change: every field may be left out, and one left out stays out. (zod's own `partial` fills
 * defaults in, which would overwrite what the change does not speak of.)
 */
export function patchOf<Shape extends z.core.$ZodLooseShape>(
  schema: z.ZodObject<Shape>,
): z.ZodObject<{ [Name in keyof Shape]: z.ZodOptional<WithoutDefault<Shape[Name]> & z.core.SomeType> }> {
  const fields = Object.entries(schema.shape as Record<string, z.ZodType>).map(([name, field]) => [
    name,
    (field instanceof z.ZodDefault ? (field.unwrap() as z.ZodType) : field).optional(),
  ]);
  return z.object(Object.fromEntries(fields)) as ReturnType<typeof patchOf<Shape>>;
}
