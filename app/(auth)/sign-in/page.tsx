import type { Metadata } from 'next';
import { redirect } from 'next/navigation';
import { SignInForm } from '@/components/auth/sign-in-form';
import { Mark } from '@/components/shell/mark';
import { pageActor } from '@/lib/server/page-actor';

export const metadata: Metadata = { title: 'Sign in' };

export default async function SignInPage() {
  if (await pageActor()) redirect('/sites');
  return (
    <main className="grid min-h-dvh place-items-center bg-harbour p-4">
      <div className="w-full max-w-[400px]">
        <div className="mb-6 flex items-center gap-3 text-on-harbour">
          <Mark />
          <span className="font-condensed text-2xl font-semibold tracking-[0.08em]">LEESIDE</span>
        </div>
        <div className="rounded bg-panel p-6 shadow-lg">
          <h1 className="font-condensed text-2xl font-semibold">Sign in</h1>
          <p className="mt-1 mb-5 text-ink-2">Rooms, stops and doses of your organisation.</p>
          <SignInForm />
        </div>
      </div>
    </main>
  );
}
