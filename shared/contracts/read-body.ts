import type { z } from 'zod';
import type { Problem } from '../lib/problem.ts';
import { problem } from '../lib/problem.ts';
import type { Result } from '../lib/result.ts';
import { accept, refuse } from '../lib/result.ts';

/**
 * Reads what came in against its schema.
 * @param body anything at all: a form's fields, or JSON
 * @returns what the schema reads, or a problem that says of each field what is wrong with it
 */
export function readBody<Schema extends z.ZodType>(schema: Schema, body: unknown): Result<z.output<Schema>, Problem> {
  const read = schema.safeParse(body);
  if (read.success) return accept(read.data);
  const fields: Record<string, string> = {};
  for (const issue of read.error.issues) fields[issue.path.join('.')] ??= issue.message;
  return refuse(
    problem(
      'fields-invalid',
      'Something is missing or cannot be read',
      'Nothing was changed. Mend what is marked and try again.',
      {
        fields,
      },
    ),
  );
}
