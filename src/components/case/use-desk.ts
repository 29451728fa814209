import { createContext, useContext, useSyncExternalStore } from 'react';
import type { DeskState, DeskStore } from './desk-store.ts';

/** What a part of the page needs besides the state of the desk. */
export interface Desk {
  store: DeskStore;
  readOnly: boolean;
  /** Local time now, YYYY-MM-DDTHH:MM. */
  now: () => string;
}

export const DeskContext = createContext<Desk | null>(null);

export const useDeskTools = (): Desk => {
  const desk = useContext(DeskContext);
  if (desk === null) throw new Error('A part of the case page stands outside it');
  return desk;
};

/** One thing of the desk; the part is drawn again only when that thing changes. */
export const useDesk = <T>(select: (state: DeskState) => T): T => {
  const { store } = useDeskTools();
  const read = () => select(store.get());
  return useSyncExternalStore(store.subscribe, read, read);
};
