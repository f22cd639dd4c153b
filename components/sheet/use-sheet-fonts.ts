'use client';

import { useEffect, useState } from 'react';

const fonts = ['500 12px "Barlow Condensed"', '600 12px "Barlow Condensed"', '12px "IBM Plex Mono"'];

/** True once the fonts of the sheet can be drawn: a canvas measures text with what is there at that moment. */
export function useSheetFonts(): boolean {
  const [ready, setReady] = useState(false);
  useEffect(() => {
    let gone = false;
    Promise.all(fonts.map((font) => document.fonts.load(font)))
      // A font that does not come must not keep the drawing away.
      .catch(() => [])
      .then(() => {
        if (!gone) setReady(true);
      });
    return () => {
      gone = true;
    };
  }, []);
  return ready;
}
