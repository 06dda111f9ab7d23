import { z } from 'zod';

const takes = (text: string) => ({ error: `takes ${text}` });

/** A name or label: some text on one line. Control characters have no business there: names reach file names, PDF and CSV. */
export const words = (longest: number) =>
  z
    .string(takes('text'))
    .trim()
    .min(1, takes('some text'))
    .max(longest, takes(`at most ${longest} characters`))
    .regex(/^\P{Cc}*$/u, takes('text without control characters'));

/** Text that may be empty and may have several lines. */
export const lines = (longest: number) =>
  z
    .string(takes('text'))
    .trim()
    .max(longest, takes(`at most ${longest} characters`))
    .regex(/^(\P{Cc}|[\n\r\t])*$/u, takes('text without control characters'));
