import type { ReactNode } from 'react';
import { Providers } from '@/components/shell/providers';
import { UserProvider } from '@/components/shell/user';
import { requirePageActor } from '@/lib/server/page-actor';

export default async function DeskLayout({ children }: { children: ReactNode }) {
  const { userId, name, email, role, organisation } = await requirePageActor();
  return (
    <UserProvider user={{ id: userId, name, email, role, organisation }}>
      <Providers>{children}</Providers>
    </UserProvider>
  );
}
