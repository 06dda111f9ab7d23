import { z } from 'zod';
import type { LoopRole } from '../kernel/tracing/frames/loop-role.ts';
import type { TracedDrawing, TraceOptions } from '../kernel/tracing/traced-drawing.ts';
import { LIMITS } from './limits.ts';
import { words } from './words.ts';

const takes = (text: string) => ({ error: `takes ${text}` });

/** Greatest gap and arc tolerance that can be asked for, millimetres. */
const WIDEST_MM = 1;
const millimetres = (from: number) =>
  z
    .number(takes(`millimetres from ${from} to ${WIDEST_MM}`))
    .min(from, takes(`millimetres from ${from} to ${WIDEST_MM}`))
    .max(WIDEST_MM, takes(`millimetres from ${from} to ${WIDEST_MM}`));

/** How a drawing is read and healed. */
export const traceOptions = z.strictObject({
  /** null: as the file says. */
  unit: z.enum(['in', 'mm'], takes('"in", "mm" or null')).nullable(),
  /** Gaps up to this are closed. */
  gap: millimetres(0),
  /** Runs of short lines that lie within this of an arc become one; null: they stay lines. */
  arcs: millimetres(0.001).nullable(),
  /** What is set aside otherwise. */
  include: z.strictObject({
    paperSpace: z.boolean(),
    offLayers: z.boolean(),
    frozenLayers: z.boolean(),
    invisible: z.boolean(),
  }),
  /** Layers, by name, that are left out. */
  leaveOut: z
    .array(z.string(takes('the name of a layer')).max(LIMITS.layerName, takes('the name of a layer')))
    .max(LIMITS.layersLeftOut, takes(`at most ${LIMITS.layersLeftOut} layers`))
    .readonly()
    .default([]),
  /** Which face the drawing shows: a back is mirrored into frame view. */
  view: z.enum(['front', 'back'], takes('"front" or "back"')),
}) satisfies z.ZodType<TraceOptions>;

export const tracing = z.object({
  id: z.string(),
  jobId: z.string(),
  jobName: z.string(),
  /** As it was uploaded. */
  fileName: z.string(),
  bytes: z.number(),
  sha256: z.string(),
  uploadedBy: z.string(),
  uploadedAt: z.string(),
  removed: z.boolean(),
  /** Frames that came of it. */
  frames: z.array(z.object({ id: z.string(), name: z.string() })),
});
export type Tracing = z.infer<typeof tracing>;

/** GET /api/jobs/:jobId/tracings: those that are not put away, newest first. POST there (multipart, field `file`) answers a tracing. */
export const tracingList = z.object({ tracings: z.array(tracing) });
export type TracingList = z.infer<typeof tracingList>;

/** PATCH /api/tracings/:tracingId: `removed` true to put it away and false to bring it back. Answers a tracing. */
export const tracingChange = z.strictObject({ removed: z.boolean() });

/** POST /api/tracings/:tracingId/reading. Answers tracedDrawing; 422 'drawing-refused' with its reason as `details.reason`. */
export const readingRequest = z.strictObject({ options: traceOptions });
export type ReadingRequest = z.input<typeof readingRequest>;

/** Large lists of numbers come from the kernel by way of our own server and are not walked through once more. */
export const tracedDrawing = z.custom<TracedDrawing>(
  (value) => typeof value === 'object' && value !== null && 'loops' in value && 'census' in value,
  { error: 'takes a drawing as it was read' },
);

const role = z.enum(['perimeter', 'opening', 'dado', 'leave-out']) satisfies z.ZodType<LoopRole>;

/**
 * POST /api/tracings/:tracingId/frames: reads the file again and adds a frame for each perimeter, all or none. `roles` has one entry
 * a loop of the reading with the same options; `frames` one a perimeter, in the order of the reading.
 */
export const tracedFramesRequest = z.strictObject({
  options: traceOptions,
  /** Said of a drawing whose end is missing. */
  confirmed: z.boolean(),
  roles: z.array(role).max(LIMITS.tracedLoops, takes(`at most ${LIMITS.tracedLoops} loops`)),
  frames: z
    .array(
      z.strictObject({
        name: words(LIMITS.nameLength),
        /** As stiles, rails and a layout, where the outline is made of them. */
        asMembers: z.boolean(),
      }),
    )
    .min(1, takes('at least one frame'))
    .max(LIMITS.tracedFrames, takes(`at most ${LIMITS.tracedFrames} frames`)),
});
export type TracedFramesRequest = z.input<typeof tracedFramesRequest>;

export const tracedFramesAdded = z.object({ frames: z.array(z.object({ id: z.string(), name: z.string() })) });
export type TracedFramesAdded = z.infer<typeof tracedFramesAdded>;

/** `details` of 'drawing-refused'. */
export const drawingRefused = z.object({ reason: z.string() });
