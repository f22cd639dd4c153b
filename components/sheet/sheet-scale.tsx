'use client';

import { createContext, useContext } from 'react';

const SheetScale = createContext(100);

export const SheetScaleProvider = SheetScale.Provider;

/** Pixels per metre on the sheet now: divide by it what keeps its size on screen whatever the zoom. */
export const useSheetScale = (): number => useContext(SheetScale);
