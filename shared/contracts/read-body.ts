import type { z } from 'zod';
import { problem, type Problem } from '../lib/problem.ts';
import { accept, refuse, type Result } from '../lib/result.ts';

/**
 * Reads what was sent by its schema: what a service does first with a body.
 * @param schema one of the contracts' bodies
 * @param body anything: fields of a form, parsed JSON, nothing at all
 * @returns what the schema makes of it, or `fields-invalid` with a sentence for each field that is wrong
 */
export function readBody<Schema extends z.ZodType>(schema: Schema, body: unknown): Result<z.output<Schema>, Problem> {
  const read = schema.safeParse(body);
  if (read.success) return accept(read.data);
  const fields: Record<string, string> = {};
  for (const issue of read.error.issues) fields[issue.path.map(String).join('.')] ??= issue.message;
  return refuse(
    problem('fields-invalid', 'Something is missing or cannot be read', 'Nothing was changed. Mend what is named, and send it again.', {
      fields,
    }),
  );
}
