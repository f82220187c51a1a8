import { z } from 'zod';

/** One thing wrong with what was sent: where, what stood there, and what is allowed. */
export const fault = z.object({
  field: z.string(),
  value: z.string(),
  message: z.string(),
});
export type Fault = z.infer<typeof fault>;

/** RFC 9457 problem details, with our stable `code` and the list of faults. */
export const problem = z.object({
  type: z.string(),
  title: z.string(),
  status: z.number(),
  detail: z.string().optional(),
  instance: z.string().optional(),
  code: z.string(),
  faults: z.array(fault).optional(),
  /** On 412: the document as it stands now and its ETag, so that the loser of a race sees both. */
  current: z.unknown().optional(),
  currentETag: z.string().optional(),
});
export type Problem = z.infer<typeof problem>;

export function fieldName(path: readonly PropertyKey[]): string {
  return path.reduce<string>(
    (text, part) =>
      typeof part === 'number' ? `${text}[${part}]` : text === '' ? String(part) : `${text}.${String(part)}`,
    '',
  );
}

function valueAt(input: unknown, path: readonly PropertyKey[]): unknown {
  let here: unknown = input;
  for (const part of path) {
    if (typeof here !== 'object' || here === null) return undefined;
    here = (here as Record<PropertyKey, unknown>)[part];
  }
  return here;
}

/** A value as a person may read it back: short, quoted when text, 'missing' when absent. */
export function shownValue(value: unknown): string {
  if (value === undefined) return 'missing';
  const text = typeof value === 'number' ? String(value) : JSON.stringify(value);
  return text.length > 80 ? `${text.slice(0, 77)}…` : text;
}

const SECRET = /password|token/iu;

/** All faults of a refused parse, in the order of the document. Secrets are never echoed. */
export function faultsOf(error: z.ZodError, input: unknown, prefix: readonly PropertyKey[] = []): Fault[] {
  return error.issues.flatMap((issue) => {
    const paths =
      issue.code === 'unrecognized_keys' ? issue.keys.map((key) => [...issue.path, key]) : [issue.path];
    return paths.map((path) => {
      const field = fieldName([...prefix, ...path]);
      const message = issue.code === 'unrecognized_keys' ? 'is not a field of this request' : issue.message;
      return { field, value: SECRET.test(field) ? 'hidden' : shownValue(valueAt(input, path)), message };
    });
  });
}
