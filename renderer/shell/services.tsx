/** What every part of the window can reach: the store, the intents, the documents and the assessing worker. */
import { createContext, type JSX, type ReactNode, use } from 'react';
import { useStore } from 'zustand';
import type { StoreApi } from 'zustand/vanilla';
import type { Assessor } from '../assessing/assessor.ts';
import type { Host } from '../host/host.ts';
import type { Documents } from '../store/documents.ts';
import type { WindowActions } from '../store/windowActions.ts';
import type { WindowState } from '../store/windowState.ts';

export interface Services {
  readonly host: Host;
  readonly store: StoreApi<WindowState>;
  readonly actions: WindowActions;
  readonly assessor: Assessor;
  readonly documents: Documents;
}

const ServicesContext = createContext<Services | null>(null);

export function ServicesProvider({
  services,
  children,
}: {
  readonly services: Services;
  readonly children: ReactNode;
}): JSX.Element {
  return <ServicesContext value={services}>{children}</ServicesContext>;
}

export function useServices(): Services {
  const services = use(ServicesContext);
  if (services === null) throw new Error('a part of the window stands outside its services');
  return services;
}

export function useActions(): WindowActions {
  return useServices().actions;
}

/** A piece of the window's state; the piece must keep its identity while nothing in it changes. */
export function useWindow<T>(piece: (state: WindowState) => T): T {
  return useStore(useServices().store, piece);
}
