'use client';

import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Notice } from '@/components/ui/notice';
import { queryKeys } from '@/lib/client/query-keys';
import { importRoom } from '@/lib/client/rooms';
import { AppError } from '@/lib/errors';

const MOST_BYTES = 2_000_000;

async function importFile(file: File) {
  if (file.size > MOST_BYTES)
    throw new AppError(
      'too_large',
      `${file.name} has ${(file.size / 1e6).toFixed(1)} MB; a room file has at most 2 MB. Nothing was changed.`,
    );
  return importRoom(await file.text());
}

/** Brings in a room file, whole or not at all; what is wrong in it is named by its place. */
export function ImportDialog({ onClose }: { onClose: () => void }) {
  const router = useRouter();
  const queries = useQueryClient();
  const bring = useMutation({
    mutationFn: importFile,
    onSuccess: ({ roomId }) => {
      void queries.invalidateQueries({ queryKey: queryKeys.rooms });
      void queries.invalidateQueries({ queryKey: queryKeys.sites });
      router.push(`/rooms/${roomId}/stops`);
    },
  });
  const faults = bring.error instanceof AppError ? bring.error.faults : [];
  return (
    <Dialog
      open
      onOpenChange={(open) => !open && onClose()}
      title="Import a room file"
      description="A .json file that Leeside exported, with the floor plan and its stop sets. They come in as drafts."
    >
      <div className="flex flex-col gap-4">
        <label className="flex flex-col gap-1 text-sm text-ink-2">
          Room file
          <input
            type="file"
            accept=".json,application/json"
            disabled={bring.isPending}
            className="w-full rounded border border-dashed border-ink-2/60 bg-field p-4 text-ink file:mr-3 file:rounded file:border-0 file:bg-action file:px-3 file:py-1.5 file:text-on-action"
            onChange={(event) => {
              const [file] = event.target.files ?? [];
              if (file) bring.mutate(file);
              // The same file, mended, may be chosen again.
              event.target.value = '';
            }}
          />
        </label>
        {bring.isPending ? <p role="status">Reading the file…</p> : null}
        {bring.error ? (
          <Notice tone="danger" role="alert" title="The file was not imported">
            <p>{bring.error.message}</p>
            {faults.length > 0 ? (
              <ul className="mt-2 max-h-56 list-disc overflow-y-auto pl-5">
                {faults.map((fault) => (
                  <li key={`${fault.path} ${fault.message}`}>
                    <code className="mono break-all">{fault.path}</code>: {fault.message}
                  </li>
                ))}
              </ul>
            ) : null}
          </Notice>
        ) : null}
        <div className="flex justify-end">
          <Button onClick={onClose}>Close</Button>
        </div>
      </div>
    </Dialog>
  );
}
