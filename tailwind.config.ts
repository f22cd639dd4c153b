import type { Config } from 'tailwindcss';

/** Colours are CSS variables so that the night theme is one set of values, not a second set of classes. */
const token = (name: string) => `var(--${name})`;

export default {
  content: ['./app/**/*.{ts,tsx}', './components/**/*.{ts,tsx}'],
  theme: {
    extend: {
      colors: {
        desk: token('desk'),
        panel: token('panel'),
        sheet: token('sheet'),
        ink: token('ink'),
        'ink-2': token('ink-2'),
        rule: token('rule'),
        harbour: token('harbour'),
        'on-harbour': token('on-harbour'),
        action: token('action'),
        'on-action': token('on-action'),
        link: token('link'),
        lamp: token('lamp'),
        umber: token('umber'),
        vermilion: token('vermilion'),
        danger: token('danger'),
        wash: token('wash'),
        field: token('field'),
        'harbour-2': token('harbour-2'),
        'on-harbour-2': token('on-harbour-2'),
        furniture: token('furniture'),
        'danger-wash': token('danger-wash'),
      },
      fontFamily: {
        sans: ['Barlow', 'system-ui', 'sans-serif'],
        condensed: ['"Barlow Condensed"', 'Barlow', 'sans-serif'],
        mono: ['"IBM Plex Mono"', 'ui-monospace', 'monospace'],
      },
      borderRadius: { DEFAULT: '4px' },
    },
  },
} satisfies Config;
