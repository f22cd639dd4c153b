'use client';

import { useState } from 'react';
import type { Autosave } from '@/components/hooks/use-autosave';
import { Button } from './button';
import { Notice } from './notice';

/**
 * Somebody else saved first, or the server refused. Nothing is lost: what is on the desk stays until the
 * person has chosen what becomes of it.
 */
export function ConflictNotice<T>({
  saving,
  what,
  onTakeTheirs,
  onKeepAsCopy,
}: {
  saving: Autosave<T>;
  what: string;
  onTakeTheirs: () => Promise<void>;
  onKeepAsCopy?: () => Promise<void>;
}) {
  const [busy, setBusy] = useState(false);
  const [failure, setFailure] = useState<string | null>(null);
  if (saving.state !== 'conflict' && saving.state !== 'error') return null;
  const act = (work: () => Promise<unknown>) => async () => {
    setBusy(true);
    setFailure(null);
    try {
      await work();
    } catch (error) {
      setFailure(error instanceof Error ? error.message : String(error));
    }
    setBusy(false);
  };
  const etag = String(saving.winner?.etag ?? '');
  return (
    <Notice
      tone="danger"
      role="alert"
      title={saving.state === 'conflict' ? 'Someone else saved first' : 'Not saved'}
    >
      <p>{saving.message}</p>
      {failure ? <p className="mt-1 font-semibold">{failure}</p> : null}
      <div className="mt-2.5 flex flex-wrap gap-2">
        {saving.state === 'conflict' ? (
          <>
            {onKeepAsCopy ? (
              <Button size="small" disabled={busy} onClick={act(onKeepAsCopy)}>
                Keep mine as a copy
              </Button>
            ) : null}
            <Button size="small" disabled={busy} onClick={act(onTakeTheirs)}>
              Take theirs
            </Button>
            <Button
              size="small"
              variant="danger"
              disabled={busy || !etag}
              onClick={act(() => saving.saveNow({ etag }))}
            >
              Save mine over the {what}
            </Button>
          </>
        ) : (
          <Button size="small" disabled={busy} onClick={act(() => saving.saveNow())}>
            Try again
          </Button>
        )}
      </div>
    </Notice>
  );
}
