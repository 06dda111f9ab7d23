import type { NavEntry } from '../ui/sheet-chrome.tsx';

export const NAV: readonly NavEntry[] = [
  { label: 'Jobs', to: '/jobs' },
  { label: 'Cutters', to: '/cutters' },
  { label: 'File profiles', to: '/profiles' },
  { label: 'Shop', to: '/shop' },
];
