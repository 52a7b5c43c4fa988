import type { Host } from '../../renderer/host/host.ts';
import type { HostCall } from '../channels.ts';

/** The main process's side of `Host`: an answer to every call, at once or later. */
export type HostAnswers = {
  readonly [Call in HostCall]: (
    ...given: Parameters<Host[Call]>
  ) => Awaited<ReturnType<Host[Call]>> | Promise<Awaited<ReturnType<Host[Call]>>>;
};
