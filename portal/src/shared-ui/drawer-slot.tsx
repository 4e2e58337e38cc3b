import { createContext, useContext } from 'react';

const Slot = createContext<HTMLElement | null>(null);

/** The frame's right edge, where a drawer docks beside the page. */
export const DrawerSlot = Slot.Provider;

export const useDrawerSlot = (): HTMLElement | null => useContext(Slot);
