import { z } from 'zod';

interface Reached {
  readonly schema: z.ZodType;
  /** How many of the keys lead there. */
  readonly keys: number;
}

/** Which form of a union the value has, by the key that tells them apart. */
function formOf(union: z.ZodDiscriminatedUnion, value: unknown): z.ZodType | undefined {
  const { discriminator } = union.def;
  const told = (value as Readonly<Record<string, unknown>> | undefined)?.[discriminator];
  return (union.options as readonly z.ZodType[]).find(
    (option) => option instanceof z.ZodObject && (option.shape[discriminator] as z.ZodType).safeParse(told).success,
  );
}

function stepInto(schema: z.ZodType, key: string, value: unknown): z.ZodType | undefined {
  if (schema instanceof z.ZodOptional) return stepInto(schema.unwrap() as z.ZodType, key, value);
  if (schema instanceof z.ZodDiscriminatedUnion) {
    const form = formOf(schema, value);
    return form && stepInto(form, key, value);
  }
  // A rule over several entries is held against all of them.
  if (schema instanceof z.ZodObject)
    return (schema.def.checks?.length ?? 0) > 0 ? undefined : (schema.shape[key] as z.ZodType | undefined);
  return schema instanceof z.ZodArray ? (schema.element as z.ZodType) : undefined;
}

/**
 * The part of a contract that an entry has to fit: its own, or that of the nearest part around it that is read as a whole, such as
 * the layout tree or a dado, whose ends belong together. A keystroke is then not held against what it cannot have changed.
 */
export function entrySchema(contract: z.ZodType, keys: readonly string[], value: unknown): Reached {
  let schema = contract;
  let part = value;
  let reached = 0;
  for (const key of keys) {
    const next = stepInto(schema, key, part);
    if (next === undefined) break;
    schema = next;
    part = (part as Readonly<Record<string, unknown>> | undefined)?.[key];
    reached++;
  }
  return { schema, keys: reached };
}
