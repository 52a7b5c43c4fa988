import type { IpcMain, IpcMainInvokeEvent, WebContents } from 'electron';
import type { z } from 'zod';
import { channelOf, HOST_CALLS, type HostCall } from '../channels.ts';
import { isWindowAddress } from './appScheme.ts';
import { ARGUMENT_SHAPES } from './argumentShapes.ts';
import type { HostAnswers } from './hostAnswers.ts';

/**
 * Answers the window's calls. A call is refused, and nothing done, when it does not come from the page of `window`
 * itself (not a frame in it, not another page), or when its arguments are not exactly what the call takes.
 */
export function answerCheckedCalls(
  ipcMain: IpcMain,
  window: () => WebContents | null,
  answers: HostAnswers,
): void {
  for (const call of HOST_CALLS) {
    ipcMain.handle(channelOf(call), async (event, ...given: unknown[]) => {
      if (!isFromWindow(event, window()))
        throw new Error(`Refused ${call}: it does not come from Tautline's window.`);
      return await answer(call, given, answers);
    });
  }
}

function isFromWindow(event: IpcMainInvokeEvent, window: WebContents | null): boolean {
  const frame = event.senderFrame;
  if (window === null || frame === null || event.sender.id !== window.id) return false;
  return frame.parent === null && isWindowAddress(frame.url);
}

function answer<Call extends HostCall>(call: Call, given: unknown[], answers: HostAnswers): unknown {
  const shape: z.ZodType<Parameters<HostAnswers[Call]>> = ARGUMENT_SHAPES[call];
  const read = shape.safeParse(given);
  if (!read.success) {
    const first = read.error.issues[0];
    throw new Error(
      `Refused ${call}: argument ${first?.path.join('.') || 'list'} is not what it takes (${first?.message}).`,
    );
  }
  const reply: (...checked: Parameters<HostAnswers[Call]>) => unknown = answers[call];
  return reply(...read.data);
}
