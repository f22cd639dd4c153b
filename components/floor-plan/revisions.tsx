'use client';

import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { queryKeys } from '@/lib/client/query-keys';
import { fetchRevisions, makeRevision } from '@/lib/client/rooms';

const day = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short', year: 'numeric' });

/** The numbered, frozen copies of the floor plan, and making one. */
export function Revisions({
  roomId,
  mayWrite,
  problems,
  onSaveNow,
}: {
  roomId: string;
  mayWrite: boolean;
  /** How many things on the plan cannot be as drawn. */
  problems: number;
  onSaveNow: () => Promise<boolean>;
}) {
  const queries = useQueryClient();
  const [note, setNote] = useState('');
  const revisions = useQuery({
    queryKey: queryKeys.revisions(roomId),
    queryFn: () => fetchRevisions(roomId),
  });
  const make = useMutation({
    mutationFn: async () => {
      // What is frozen is what is saved.
      if (!(await onSaveNow())) throw new Error('The floor plan is not saved yet, so no revision was made.');
      return makeRevision(roomId, note);
    },
    onSuccess: () => {
      setNote('');
      void queries.invalidateQueries({ queryKey: queryKeys.revisions(roomId) });
      void queries.invalidateQueries({ queryKey: queryKeys.rooms, refetchType: 'none' });
    },
  });
  const list = revisions.data?.revisions ?? [];
  return (
    <section aria-labelledby="revisions-heading">
      <h2 id="revisions-heading" className="label">
        Revisions
      </h2>
      {revisions.error ? (
        <p className="mt-1 text-danger">The revisions could not be loaded.</p>
      ) : list.length === 0 ? (
        <p className="mt-1 text-ink-2">None yet. A revision is a numbered copy that does not change.</p>
      ) : (
        <ul className="mt-1">
          {list.map((revision) => (
            <li key={revision.number} className="flex gap-3 border-b border-rule/60 py-1">
              <span className="mono shrink-0">Rev {revision.number}</span>
              <span className="min-w-0 flex-1 truncate" title={revision.note}>
                {revision.note || revision.createdBy}
              </span>
              <span className="shrink-0 text-sm text-ink-2">{day.format(new Date(revision.createdAt))}</span>
            </li>
          ))}
        </ul>
      )}
      {mayWrite ? (
        <form
          className="mt-2 flex items-end gap-2"
          onSubmit={(event) => {
            event.preventDefault();
            make.mutate();
          }}
        >
          <TextField
            label="What has changed"
            className="min-w-0 flex-1"
            maxLength={200}
            value={note}
            onChange={(event) => setNote(event.target.value)}
          />
          <Button type="submit" disabled={make.isPending}>
            Save revision
          </Button>
        </form>
      ) : null}
      {problems > 0 && mayWrite ? (
        <p className="mt-1 text-sm text-danger">
          {problems === 1 ? 'One thing' : `${problems} things`} on the plan cannot be as drawn: see “To put
          right”.
        </p>
      ) : null}
      {make.error ? (
        <Notice tone="danger" role="alert">
          {make.error.message}
        </Notice>
      ) : null}
    </section>
  );
}
