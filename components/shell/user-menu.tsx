'use client';

import { UserRound } from 'lucide-react';
import { signOut } from 'next-auth/react';
import { DropdownMenu } from 'radix-ui';
import { useState } from 'react';
import { applyTheme, THEME_COOKIE, type Theme, themes, toTheme } from './theme';
import { useUser } from './user';

const item =
  'flex cursor-pointer items-center gap-2 rounded px-2.5 py-1.5 outline-none data-[highlighted]:bg-wash';

const themeLabels: Record<Theme, string> = {
  system: 'As this device',
  light: 'Day',
  dark: 'Night shift',
};

const chosenTheme = (): Theme =>
  toTheme(
    document.cookie
      .split('; ')
      .find((cookie) => cookie.startsWith(`${THEME_COOKIE}=`))
      ?.split('=')[1],
  );

export function UserMenu() {
  const user = useUser();
  const [theme, setTheme] = useState<Theme>('system');
  return (
    <DropdownMenu.Root onOpenChange={(open) => open && setTheme(chosenTheme())}>
      <DropdownMenu.Trigger
        className="flex h-9 items-center gap-2 rounded px-2 text-on-harbour hover:bg-harbour-2"
        aria-label={`Account: ${user.name}, ${user.role}`}
      >
        <UserRound size={17} aria-hidden />
        <span className="hidden capitalize xl:inline">{user.role}</span>
      </DropdownMenu.Trigger>
      <DropdownMenu.Portal>
        <DropdownMenu.Content
          align="end"
          sideOffset={6}
          className="z-50 w-60 rounded-md border border-rule bg-panel p-1.5 text-ink shadow-lg"
        >
          <div className="px-2.5 py-2">
            <p className="font-semibold">{user.name}</p>
            <p className="text-sm text-ink-2">
              <span className="capitalize">{user.role}</span>, {user.organisation}
            </p>
          </div>
          <DropdownMenu.Separator className="my-1 border-t" />
          <DropdownMenu.RadioGroup
            value={theme}
            onValueChange={(value) => {
              setTheme(toTheme(value));
              applyTheme(toTheme(value));
            }}
          >
            <DropdownMenu.Label className="label px-2.5 py-1">Theme</DropdownMenu.Label>
            {themes.map((option) => (
              <DropdownMenu.RadioItem
                key={option}
                value={option}
                className={item}
                onSelect={(event) => event.preventDefault()}
              >
                <span className="w-4">{option === theme ? '●' : ''}</span>
                {themeLabels[option]}
              </DropdownMenu.RadioItem>
            ))}
          </DropdownMenu.RadioGroup>
          <DropdownMenu.Separator className="my-1 border-t" />
          <DropdownMenu.Item className={item} onSelect={() => signOut({ callbackUrl: '/sign-in' })}>
            Sign out
          </DropdownMenu.Item>
        </DropdownMenu.Content>
      </DropdownMenu.Portal>
    </DropdownMenu.Root>
  );
}
