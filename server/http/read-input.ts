import type { Request } from 'express';
import type { z } from 'zod';
import { fieldErrors } from '#shared/contracts/field-errors.ts';
import { AppError, notFound } from '../errors.ts';

function read<T extends z.ZodType>(schema: T, input: unknown): z.output<T> {
  const result = schema.safeParse(input);
  if (result.success) return result.data;
  const fields = fieldErrors(result.error, input);
  throw new AppError('invalid-input', fields.map((f) => f.message).join('; '), { fields });
}

/** The JSON body, held against its contract. Throws 'invalid-input' with an error for each wrong field. */
export const readBody = <T extends z.ZodType>(req: Request, schema: T): z.output<T> => read(schema, req.body ?? {});

/** The query string, held against its contract. Throws 'invalid-input' with an error for each wrong field. */
export const readQuery = <T extends z.ZodType>(req: Request, schema: T): z.output<T> => read(schema, req.query);

/**
 * A parameter of the path; the route's pattern promises that it is there. Throws 'not-found' for what no id can be:
 * the database would refuse a control character with an error of its own.
 */
export function pathParameter(req: Request, name: string): string {
  const value = req.params[name];
  if (typeof value !== 'string') throw new Error(`route ${req.path} has no parameter ${name}`);
  if (/\p{Cc}/u.test(value)) throw notFound('path');
  return value;
}
