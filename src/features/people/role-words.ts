import { role, type Role } from '#shared/contracts/roles.ts';
import type { Option } from '../../ui/choice.tsx';

/** What each role is for, in a few words. */
export const ROLE_WORDS: Record<Role, string> = {
  owner: 'everything, people and settings too',
  designer: 'jobs, frames and releases',
  programmer: 'cutters, file profiles and downloads',
  operator: 'downloads and setup sheets',
};

export const ROLE_OPTIONS: readonly Option<Role>[] = role.options.map((value) => ({
  value,
  label: `${value}: ${ROLE_WORDS[value]}`,
}));
