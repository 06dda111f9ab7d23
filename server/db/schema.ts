import {
  boolean,
  customType,
  doublePrecision,
  index,
  integer,
  json,
  pgTable,
  primaryKey,
  text,
  timestamp,
  uniqueIndex,
} from 'drizzle-orm/pg-core';
import { sql } from 'drizzle-orm';
import type { DrawerEntry } from '#shared/kernel/cutter-drawer/drawer-cutter.ts';
import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';
import type { EdgePreset } from '#shared/kernel/starters/edge-preset.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';

/** PGlite answers Uint8Array, pg answers Buffer, which is one. */
const bytes = customType<{ data: Uint8Array; driverData: Uint8Array }>({ dataType: () => 'bytea' });

const moment = (name: string) => timestamp(name, { withTimezone: true, precision: 3, mode: 'date' });

export const shops = pgTable('shops', {
  id: text().primaryKey(),
  name: text().notNull(),
  unit: text({ enum: ['in', 'mm'] }).notNull(),
  paper: text({ enum: ['A4', 'Letter'] }).notNull(),
  /** A built-in profile, or one of the shop's own. Built-in ones live in code, so there is no foreign key. */
  defaultProfileId: text('default_profile_id').notNull(),
  demo: boolean().notNull().default(false),
  createdAt: moment('created_at').notNull(),
});

export const users = pgTable(
  'users',
  {
    id: text().primaryKey(),
    shopId: text('shop_id')
      .notNull()
      .references(() => shops.id),
    name: text().notNull(),
    /** Lower case. */
    email: text().notNull(),
    /** argon2id; null for demo people, who have no password. */
    passwordHash: text('password_hash'),
    role: text({ enum: ['owner', 'designer', 'programmer', 'operator'] }).notNull(),
    createdAt: moment('created_at').notNull(),
    /** Access was taken away: signing in is refused and there are no sessions. */
    disabled: boolean().notNull().default(false),
    /** Null until the first time. */
    lastSignInAt: moment('last_sign_in_at'),
  },
  (t) => [uniqueIndex('users_email').on(t.email), index('users_shop').on(t.shopId)],
);

/** An open door into a shop, until it is used, revoked or past its time. */
export const invitations = pgTable(
  'invitations',
  {
    id: text().primaryKey(),
    shopId: text('shop_id')
      .notNull()
      .references(() => shops.id),
    /** Lower case. */
    email: text().notNull(),
    role: text({ enum: ['owner', 'designer', 'programmer', 'operator'] }).notNull(),
    /** SHA-256 of the mailed token, so that a copy of the table opens no shop. */
    tokenHash: text('token_hash').notNull(),
    invitedBy: text('invited_by').notNull(),
    invitedAt: moment('invited_at').notNull(),
    expiresAt: moment('expires_at').notNull(),
    usedAt: moment('used_at'),
    revokedAt: moment('revoked_at'),
  },
  (t) => [
    uniqueIndex('invitations_token').on(t.tokenHash),
    // One open invitation an address and shop.
    uniqueIndex('invitations_open')
      .on(t.shopId, t.email)
      .where(sql`${t.usedAt} is null and ${t.revokedAt} is null`),
  ],
);

/** Mailed leave to set a new password, once. */
export const passwordResets = pgTable(
  'password_resets',
  {
    /** SHA-256 of the mailed token. */
    tokenHash: text('token_hash').primaryKey(),
    userId: text('user_id')
      .notNull()
      .references(() => users.id),
    expiresAt: moment('expires_at').notNull(),
    usedAt: moment('used_at'),
  },
  (t) => [index('password_resets_user').on(t.userId)],
);

export const sessions = pgTable(
  'sessions',
  {
    /** SHA-256 of the session id, so that a copy of the table opens no session. */
    idHash: text('id_hash').primaryKey(),
    userId: text('user_id').references(() => users.id),
    data: json().$type<unknown>().notNull(),
    expiresAt: moment('expires_at').notNull(),
  },
  (t) => [index('sessions_user').on(t.userId), index('sessions_expiry').on(t.expiresAt)],
);

export const profiles = pgTable(
  'profiles',
  {
    id: text().primaryKey(),
    shopId: text('shop_id')
      .notNull()
      .references(() => shops.id),
    name: text().notNull(),
    profile: json().$type<FileProfile>().notNull(),
    changedAt: moment('changed_at').notNull(),
  },
  (t) => [uniqueIndex('profiles_shop_name').on(t.shopId, sql`lower(${t.name})`)],
);

/** A shop's cutter drawer. Frames keep copies of the numbers and refer to nothing here. */
export const cutters = pgTable(
  'cutters',
  {
    id: text().primaryKey(),
    shopId: text('shop_id')
      .notNull()
      .references(() => shops.id),
    /** The cutter's own, once more for the index. */
    name: text().notNull(),
    /** Unit of the lengths in `cutter`. */
    unit: text({ enum: ['in', 'mm'] }).notNull(),
    cutter: json().$type<DrawerEntry['cutter']>().notNull(),
    remarks: text().notNull(),
    changedAt: moment('changed_at').notNull(),
  },
  (t) => [uniqueIndex('cutters_shop_name').on(t.shopId, sql`lower(${t.name})`)],
);

/** Edges of openings that a shop saved to use again. */
export const edgePresets = pgTable(
  'edge_presets',
  {
    id: text().primaryKey(),
    shopId: text('shop_id')
      .notNull()
      .references(() => shops.id),
    name: text().notNull(),
    preset: json().$type<EdgePreset>().notNull(),
    changedAt: moment('changed_at').notNull(),
  },
  (t) => [uniqueIndex('edge_presets_shop_name').on(t.shopId, sql`lower(${t.name})`)],
);

export const jobs = pgTable(
  'jobs',
  {
    id: text().primaryKey(),
    shopId: text('shop_id')
      .notNull()
      .references(() => shops.id),
    name: text().notNull(),
    createdAt: moment('created_at').notNull(),
    changedAt: moment('changed_at').notNull(),
    removed: boolean().notNull().default(false),
  },
  (t) => [index('jobs_shop').on(t.shopId)],
);

/** A drawing that somebody uploaded to trace frames from. The file itself lies in the file store under its hash. */
export const tracings = pgTable(
  'tracings',
  {
    id: text().primaryKey(),
    shopId: text('shop_id')
      .notNull()
      .references(() => shops.id),
    jobId: text('job_id')
      .notNull()
      .references(() => jobs.id),
    fileName: text('file_name').notNull(),
    bytes: integer().notNull(),
    sha256: text().notNull(),
    uploadedBy: text('uploaded_by').notNull(),
    uploadedAt: moment('uploaded_at').notNull(),
    removed: boolean().notNull().default(false),
  },
  (t) => [index('tracings_job').on(t.jobId), index('tracings_shop').on(t.shopId)],
);

/** A frame and its draft. The figures of the draft are kept beside it for tables. */
export const frames = pgTable(
  'frames',
  {
    id: text().primaryKey(),
    shopId: text('shop_id')
      .notNull()
      .references(() => shops.id),
    jobId: text('job_id')
      .notNull()
      .references(() => jobs.id),
    /** The drawing that it was traced from. */
    tracingId: text('tracing_id').references(() => tracings.id),
    // json, not jsonb: it keeps the order of keys and every digit as written.
    particulars: json().$type<Particulars>().notNull(),
    version: integer().notNull(),
    changedAt: moment('changed_at').notNull(),
    changedBy: text('changed_by').notNull(),
    removed: boolean().notNull().default(false),
    /** Newest released letter, '' before the first. */
    letter: text().notNull().default(''),
    draftChanged: boolean('draft_changed').notNull(),
    width: doublePrecision().notNull(),
    height: doublePrecision().notNull(),
    openings: integer().notNull(),
    stops: integer().notNull(),
    cautions: integer().notNull(),
    notes: integer().notNull(),
    createdAt: moment('created_at').notNull(),
    /** Order of entry. */
    ordinal: integer().generatedAlwaysAsIdentity().notNull(),
  },
  (t) => [index('frames_job').on(t.jobId), index('frames_shop').on(t.shopId)],
);

/** Recent versions of a draft, to tell a stale editor what was changed since. */
export const draftVersions = pgTable(
  'draft_versions',
  {
    frameId: text('frame_id')
      .notNull()
      .references(() => frames.id),
    version: integer().notNull(),
    particulars: json().$type<Particulars>().notNull(),
  },
  (t) => [primaryKey({ columns: [t.frameId, t.version] })],
);

/** Frozen particulars. A trigger refuses UPDATE, DELETE and TRUNCATE. */
export const revisions = pgTable(
  'revisions',
  {
    id: text().primaryKey(),
    shopId: text('shop_id')
      .notNull()
      .references(() => shops.id),
    frameId: text('frame_id')
      .notNull()
      .references(() => frames.id),
    letter: text().notNull(),
    /** 1 for the first letter: letters do not sort by themselves (Y, AA). */
    ordinal: integer().notNull(),
    note: text().notNull(),
    author: text().notNull(),
    authorId: text('author_id')
      .notNull()
      .references(() => users.id),
    releasedAt: moment('released_at').notNull(),
    jobName: text('job_name').notNull(),
    shopName: text('shop_name').notNull(),
    acknowledged: json().$type<string[]>().notNull(),
    file: bytes().notNull(),
    sha256: text().notNull(),
  },
  (t) => [
    uniqueIndex('revisions_frame_letter').on(t.frameId, t.letter),
    uniqueIndex('revisions_frame_ordinal').on(t.frameId, t.ordinal),
  ],
);

/** Mails that were queued, and what became of each. Their moments are the mailer's, but for `queuedAt`. */
export const mails = pgTable(
  'mails',
  {
    id: text().primaryKey(),
    /** What the mail tells of: one mail for one event. */
    event: text().notNull(),
    /** Null for a mail of no shop. */
    shopId: text('shop_id').references(() => shops.id),
    to: text('to_address').notNull(),
    subject: text().notNull(),
    /** Emptied once sent, as `html` is: links in it open doors. */
    text: text().notNull(),
    html: text().notNull(),
    /** 'outbox': there was no mail server, so it waits to be read in the product and is never sent. */
    state: text({ enum: ['waiting', 'sent', 'failed', 'outbox'] })
      .notNull()
      .default('waiting'),
    /** Not before this moment; null: at once. */
    dueAt: moment('due_at'),
    /** The mailer that is sending it, and until when nobody else may. */
    claim: text(),
    claimedUntil: moment('claimed_until'),
    tries: integer().notNull().default(0),
    firstTriedAt: moment('first_tried_at'),
    lastError: text('last_error'),
    /** By the database's clock: the moment of the event's transaction. */
    queuedAt: moment('queued_at').notNull().defaultNow(),
    sentAt: moment('sent_at'),
    /** Order of entry. */
    ordinal: integer().generatedAlwaysAsIdentity().notNull(),
  },
  (t) => [
    uniqueIndex('mails_event').on(t.event),
    index('mails_shop').on(t.shopId, t.ordinal),
    index('mails_waiting')
      .on(t.ordinal)
      .where(sql`${t.state} = 'waiting'`),
  ],
);
