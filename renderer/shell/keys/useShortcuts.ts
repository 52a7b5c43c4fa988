import { useEffect } from 'react';
import type { Pushing } from '../../store/push.ts';
import { isPressed } from '../commands/command.ts';
import { COMMANDS, runCommand } from '../commands/commands.ts';
import { useServices } from '../services.tsx';
import { toNextRegion } from './regions.ts';

/** The window's keys: commands, F6 between regions, Escape back one step, Enter to keep what is on trial. */
export function useShortcuts(): void {
  const services = useServices();
  useEffect(() => {
    const onKeyDown = (event: KeyboardEvent): void => {
      if (event.defaultPrevented || services.store.getState().dialog !== null) return;
      if (event.key === 'F6') {
        event.preventDefault();
        toNextRegion(event.shiftKey ? -1 : 1);
        return;
      }
      if (event.key === 'Escape') {
        goBack(event);
        return;
      }
      if (event.key === 'Enter' && services.store.getState().trying !== null && isIdle(event.target)) {
        event.preventDefault();
        services.actions.keepTrial();
        return;
      }
      const command = COMMANDS.find(({ shortcut }) => shortcut !== undefined && isPressed(shortcut, event));
      if (command?.shortcut === undefined) return;
      if (command.shortcut.ctrl !== true && takesText(event.target)) return;
      event.preventDefault();
      runCommand(command, services);
    };
    const goBack = (event: KeyboardEvent): void => {
      const { trying, selection, view, pushing } = services.store.getState();
      if (trying !== null) services.actions.putBackTrial();
      else if (view.push && isPushedByHand(pushing)) services.actions.push({ force: [0, 0] });
      else if (view.push) services.actions.setPushMode(false);
      else if (selection.crossing !== null || selection.end !== null) services.actions.stepBack();
      else return;
      event.preventDefault();
    };
    window.addEventListener('keydown', onKeyDown);
    return () => window.removeEventListener('keydown', onKeyDown);
  }, [services]);
}

/** A push that a hand has made is put back first; only then does Escape leave pushing. */
function isPushedByHand({ force }: Pushing): boolean {
  return force !== null && Math.hypot(...force) > 0;
}

/** Where single letters are text and not commands. */
function takesText(target: EventTarget | null): boolean {
  if (!(target instanceof HTMLElement)) return false;
  if (
    target.isContentEditable ||
    target instanceof HTMLTextAreaElement ||
    target instanceof HTMLSelectElement
  )
    return true;
  return target instanceof HTMLInputElement && !['checkbox', 'radio', 'button'].includes(target.type);
}

/** Where Enter would do nothing of its own. */
function isIdle(target: EventTarget | null): boolean {
  return !(target instanceof HTMLElement) || target === document.body || target.hasAttribute('data-region');
}
