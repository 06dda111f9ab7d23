import { createContext, useContext, type ReactNode } from 'react';

export interface NavEntry {
  readonly label: string;
  readonly to: string;
}

/** What every drawing sheet shows and no single page knows: where one can go, and who is signed in. */
export interface SheetChrome {
  readonly nav: readonly NavEntry[];
  /** At the far end of the header; '' or a link to sign in, name and sign-out. */
  readonly account: ReactNode;
  /** Title block cell "Shop"; '' when nobody is signed in. */
  readonly shopName: string;
}

const chromeContext = createContext<SheetChrome>({ nav: [], account: null, shopName: '' });

export const SheetChromeProvider = chromeContext.Provider;

export const useSheetChrome = (): SheetChrome => useContext(chromeContext);
