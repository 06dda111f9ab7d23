import { may, type Act, type Role } from '#shared/contracts/roles.ts';
import type { NavEntry } from '../ui/sheet-chrome.tsx';

/** With `act`: only for those who may. */
const ENTRIES: readonly (NavEntry & { readonly act?: Act })[] = [
  { label: 'Jobs', to: '/jobs' },
  { label: 'Cutters', to: '/cutters' },
  { label: 'File profiles', to: '/profiles' },
  { label: 'People', to: '/people', act: 'manage-people' },
  { label: 'Outbox', to: '/outbox', act: 'manage-people' },
  { label: 'Shop', to: '/shop' },
];

/** Where a person of this role can go. */
export const navOf = (role: Role): readonly NavEntry[] =>
  ENTRIES.filter(({ act }) => act === undefined || may(role, act)).map(({ label, to }) => ({ label, to }));
