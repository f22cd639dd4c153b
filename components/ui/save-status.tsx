'use client';

import type { SaveStanding } from '@/lib/client/autosave';

const clock = new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit' });

/** How saving stands, in the header. Conflicts and refusals have their own notice beside the work. */
export function SaveStatus({ state, savedAt }: Pick<SaveStanding, 'state' | 'savedAt'>) {
  const words = {
    saved: savedAt ? `Saved ${clock.format(savedAt)}` : 'Saved',
    unsaved: 'Not saved yet',
    saving: 'Saving…',
    conflict: 'Not saved: changed by someone else',
    offline: 'No network · kept here, trying again',
    error: 'Not saved',
  }[state];
  const trouble = state === 'conflict' || state === 'error' || state === 'offline';
  return (
    <span role="status" data-save-state={state} className={trouble ? 'font-semibold text-lamp' : ''}>
      {words}
    </span>
  );
}
