import { createContext, type ReactNode, useContext } from 'react';
import type { PageContext } from 'vike/types';

const Context = createContext<PageContext | null>(null);

export function PageContextProvider({ value, children }: { value: PageContext; children: ReactNode }) {
  return <Context value={value}>{children}</Context>;
}

/** Vike's page context, on the server and in the browser. */
export function usePageContext(): PageContext {
  const value = useContext(Context);
  if (!value) throw new Error('usePageContext outside of a page.');
  return value;
}
