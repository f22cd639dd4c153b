'use client';

import { Plus, Upload } from 'lucide-react';
import { useDeferredValue, useState } from 'react';
import { useRooms, useSites } from '@/components/hooks/queries';
import { DeskHeader } from '@/components/shell/desk-header';
import { useUser } from '@/components/shell/user';
import { Button } from '@/components/ui/button';
import { Empty, Skeleton } from '@/components/ui/empty';
import { Failure } from '@/components/ui/failure';
import { SelectField, TextField } from '@/components/ui/field';
import { can } from '@/lib/access/permissions';
import { ImportDialog } from './import-dialog';
import { NewRoomDialog } from './new-room-dialog';
import { RoomsTable } from './rooms-table';

const matches = (text: string, words: string) =>
  words
    .toLowerCase()
    .split(/\s+/)
    .every((word) => text.toLowerCase().includes(word));

export function RoomsPage() {
  const user = useUser();
  const rooms = useRooms();
  const sites = useSites();
  const [search, setSearch] = useState('');
  const [siteId, setSiteId] = useState('');
  const [dialog, setDialog] = useState<'new' | 'import' | null>(null);
  const words = useDeferredValue(search.trim());
  const mayWrite = can(user.role, 'rooms:write');
  const all = (rooms.data?.rooms ?? []).filter((room) => !room.archived);
  const shown = all.filter(
    (room) =>
      (siteId === '' || room.site.id === siteId) &&
      matches(`${room.name} ${room.area ?? ''} ${room.site.name}`, words),
  );

  return (
    <div className="flex min-h-dvh flex-col">
      <DeskHeader crumbs={[{ label: user.organisation }, { label: 'Sites and rooms' }]} />
      <main className="mx-auto w-full max-w-6xl flex-1 p-4 sm:p-6">
        <div className="mb-5 flex flex-wrap items-end gap-3">
          <h1 className="mr-auto font-condensed text-3xl font-semibold">Sites and rooms</h1>
          {mayWrite ? (
            <>
              <Button icon={<Upload size={16} aria-hidden />} onClick={() => setDialog('import')}>
                Import a room file
              </Button>
              <Button
                variant="primary"
                icon={<Plus size={17} aria-hidden />}
                onClick={() => setDialog('new')}
              >
                New room
              </Button>
            </>
          ) : null}
        </div>
        {rooms.isError ? (
          <Failure error={rooms.error} what="list of rooms" onRetry={() => void rooms.refetch()} />
        ) : rooms.isPending ? (
          <div className="flex flex-col gap-2" aria-busy="true">
            {['a', 'b', 'c', 'd'].map((row) => (
              <Skeleton key={row} className="h-14" />
            ))}
          </div>
        ) : all.length === 0 ? (
          <Empty
            title="No rooms yet"
            action={
              mayWrite ? (
                <Button variant="primary" onClick={() => setDialog('new')}>
                  Draw the first room
                </Button>
              ) : null
            }
          >
            A room is drawn once, to measure; stops are then placed in it and crews follow them.
            {mayWrite ? null : ' A planner or the owner can draw one.'}
          </Empty>
        ) : (
          <>
            <search className="mb-4 grid max-w-2xl grid-cols-1 gap-3 sm:grid-cols-2">
              <TextField
                label="Search"
                type="search"
                placeholder="Room, ward or site"
                value={search}
                onChange={(event) => setSearch(event.target.value)}
              />
              <SelectField label="Site" value={siteId} onChange={(event) => setSiteId(event.target.value)}>
                <option value="">All sites</option>
                {sites.data?.sites.map((site) => (
                  <option key={site.id} value={site.id}>
                    {site.name}
                  </option>
                ))}
              </SelectField>
            </search>
            {shown.length === 0 ? (
              <Empty
                title="No room fits that"
                action={
                  <Button
                    onClick={() => {
                      setSearch('');
                      setSiteId('');
                    }}
                  >
                    Show all rooms
                  </Button>
                }
              />
            ) : (
              <RoomsTable rooms={shown} />
            )}
          </>
        )}
      </main>
      {dialog === 'new' ? (
        <NewRoomDialog sites={sites.data?.sites ?? []} onClose={() => setDialog(null)} />
      ) : null}
      {dialog === 'import' ? <ImportDialog onClose={() => setDialog(null)} /> : null}
    </div>
  );
}
