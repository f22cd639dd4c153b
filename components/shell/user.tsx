'use client';

import { createContext, type ReactNode, useContext } from 'react';
import type { Role } from '@/lib/access/roles';

export interface SignedIn {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly role: Role;
  readonly organisation: string;
}

const UserContext = createContext<SignedIn | null>(null);

export function UserProvider({ user, children }: { user: SignedIn; children: ReactNode }) {
  return <UserContext value={user}>{children}</UserContext>;
}

/** Who is signed in; the desk's layout has made sure that someone is. */
export function useUser(): SignedIn {
  const user = useContext(UserContext);
  if (!user) throw new Error('useUser is for pages inside the desk layout');
  return user;
}
