import { createContext, useContext } from 'react';
import type { DrawerCutter } from '#shared/kernel/cutter-drawer/drawer-cutter.ts';

const drawerContext = createContext<readonly DrawerCutter[]>([]);

/** The shop's cutters, for forms that take numbers from them. */
export const DrawerProvider = drawerContext.Provider;

export const useDrawer = (): readonly DrawerCutter[] => useContext(drawerContext);
