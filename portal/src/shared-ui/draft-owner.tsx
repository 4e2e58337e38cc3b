import { createContext, useContext } from 'react';

const Owner = createContext('nobody');

/** Set once by the frame to the id of the person signed in, so that each keeps drafts of their own on a shared device. */
export const DraftOwner = Owner.Provider;

export const useDraftOwner = (): string => useContext(Owner);
