/**
 * Colours of what is drawn on the sheet. The sheet is paper by day and by night (by night it is dimmed as a
 * whole), so its inks are fixed, and the same on screen, in print and in a PDF.
 */
export const ink = {
  wall: '#1e2326',
  text: '#1e2326',
  faint: '#5b6468',
  rule: '#b9b3a5',
  furniture: '#e6e2d7',
  paper: '#fcfbf7',
  umber: '#5a2f08',
  harbour: '#12323f',
  link: '#1b6a85',
  lamp: '#e0b45c',
  danger: '#a83420',
} as const;
