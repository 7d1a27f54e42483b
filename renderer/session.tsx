import { createContext, type ReactNode, useContext } from 'react';
import type { SessionView } from '#shared/contracts/session.ts';

const Context = createContext<SessionView | null>(null);

export function SessionProvider({ value, children }: { value: SessionView | null; children: ReactNode }) {
  return <Context value={value}>{children}</Context>;
}

/** Who is signed in, and in which club. Only inside an area that is not open to all. */
export function useSession(): SessionView {
  const session = useContext(Context);
  if (!session) throw new Error('useSession outside of an area, or with nobody signed in.');
  return session;
}

/** Who is signed in, if anybody is: for places that are open to all. */
export function useVisitor(): SessionView | null {
  return useContext(Context);
}
