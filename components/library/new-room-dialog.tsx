'use client';

import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { useUser } from '@/components/shell/user';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { SelectField, TextField } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { can } from '@/lib/access/permissions';
import { queryKeys } from '@/lib/client/query-keys';
import { addRoom, addSite } from '@/lib/client/rooms';
import { AppError } from '@/lib/errors';
import type { Site } from '@/lib/room/api/resources';

const NEW_SITE = 'new';

/** Names a room and leads to its empty sheet. */
export function NewRoomDialog({ sites, onClose }: { sites: readonly Site[]; onClose: () => void }) {
  const user = useUser();
  const router = useRouter();
  const queries = useQueryClient();
  const mayAddSite = can(user.role, 'sites:write');
  const [siteId, setSiteId] = useState(sites[0]?.id ?? (mayAddSite ? NEW_SITE : ''));
  const add = useMutation({
    mutationFn: async (form: FormData) => {
      const site = siteId === NEW_SITE ? (await addSite(String(form.get('site')))).id : siteId;
      const area = String(form.get('area') ?? '').trim();
      return addRoom({ siteId: site, name: String(form.get('name')), ...(area ? { area } : {}) });
    },
    onSuccess: (room) => {
      void queries.invalidateQueries({ queryKey: queryKeys.rooms });
      void queries.invalidateQueries({ queryKey: queryKeys.sites });
      router.push(`/rooms/${room.id}/floor-plan`);
    },
  });
  const faults = add.error instanceof AppError ? add.error.faults : [];
  const fault = (path: string) => faults.find((one) => one.path === path)?.message;
  return (
    <Dialog open onOpenChange={(open) => !open && onClose()} title="New room">
      <form
        className="flex flex-col gap-3"
        onSubmit={(event) => {
          event.preventDefault();
          add.mutate(new FormData(event.currentTarget));
        }}
      >
        {add.error && faults.length === 0 ? (
          <Notice tone="danger" role="alert">
            {add.error.message}
          </Notice>
        ) : null}
        <SelectField label="Site" value={siteId} onChange={(event) => setSiteId(event.target.value)}>
          {sites.map((site) => (
            <option key={site.id} value={site.id}>
              {site.name}
            </option>
          ))}
          {mayAddSite ? <option value={NEW_SITE}>A new site…</option> : null}
        </SelectField>
        {siteId === NEW_SITE ? (
          <TextField label="Name of the new site" name="site" required maxLength={80} />
        ) : null}
        <TextField
          label="Room"
          name="name"
          required
          maxLength={80}
          placeholder="Side room 3.05"
          error={fault('name')}
          autoFocus
        />
        <TextField
          label="Ward or part of the site"
          name="area"
          maxLength={80}
          placeholder="Ward 3"
          error={fault('area')}
          hint="May be left empty"
        />
        <div className="mt-2 flex justify-end gap-2">
          <Button onClick={onClose}>Cancel</Button>
          <Button variant="primary" type="submit" disabled={add.isPending || siteId === ''}>
            {add.isPending ? 'Adding…' : 'Add and draw it'}
          </Button>
        </div>
      </form>
    </Dialog>
  );
}
