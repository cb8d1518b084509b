import { removeSelectedKeys } from './state/commands';
import { type DesignerSession } from './session/designer-session';
import { type Saving } from './session/saving';
import { type Player } from './transport/player';
import { setKeyAtPlayhead } from './transport/transport';

/** What the keystrokes act on. */
export interface Hands {
  readonly session: DesignerSession;
  readonly player: Player;
  readonly saving: Saving;
}

/** Keystrokes by the name of the key, with `Ctrl+` (or ⌘), `Shift+` before it; single keys do not work while typing. */
const KEYSTROKES: Readonly<Record<string, (hands: Hands) => void>> = {
  ' ': ({ player }) => player.toggle(),
  j: ({ player }) => player.shuttle(-1),
  k: ({ player }) => player.stop(),
  l: ({ player }) => player.shuttle(1),
  ArrowLeft: ({ player }) => player.step(-1),
  ArrowRight: ({ player }) => player.step(1),
  'Shift+ArrowLeft': ({ player }) => player.jump(-1),
  'Shift+ArrowRight': ({ player }) => player.jump(1),
  Home: ({ player }) => player.toStart(),
  End: ({ player }) => player.toEnd(),
  n: ({ session }) => setKeyAtPlayhead(session),
  Delete: ({ session }) => session.run(removeSelectedKeys),
  Backspace: ({ session }) => session.run(removeSelectedKeys),
  Escape: ({ session }) => {
    session.cancel();
    session.hand.set(undefined);
  },
  'Ctrl+z': ({ session }) => session.undo(),
  'Ctrl+Shift+z': ({ session }) => session.redo(),
  'Ctrl+y': ({ session }) => session.redo(),
  'Ctrl+s': ({ saving }) => void saving.save(),
};

/** @returns whether the keystroke was one of ours */
export function keystroke(event: KeyboardEvent, hands: Hands): boolean {
  const command = event.ctrlKey || event.metaKey;
  if (event.altKey || (!command && isTyping(event.target))) return false;
  const key = event.key.length === 1 ? event.key.toLowerCase() : event.key;
  const name = `${command ? 'Ctrl+' : ''}${event.shiftKey ? 'Shift+' : ''}${key}`;
  const action = Object.hasOwn(KEYSTROKES, name) ? KEYSTROKES[name] : undefined;
  if (!action || (key === ' ' && isHeldByKeyboard(event.target))) return false;
  event.preventDefault();
  action(hands);
  return true;
}

/** A button reached by the keyboard is pressed by the space bar; one that was clicked has let go (releaseClicked). */
function isHeldByKeyboard(target: EventTarget | null): boolean {
  return target instanceof HTMLButtonElement || target instanceof HTMLAnchorElement;
}

/** A button that was clicked gives the keyboard back, so that space plays and arrows step at once. */
export function releaseClicked(event: MouseEvent): void {
  // A click made by the keyboard counts no presses of a pointer.
  if (event.detail === 0 || !(event.target instanceof Element)) return;
  event.target.closest('button')?.blur();
}

function isTyping(target: EventTarget | null): boolean {
  if (target instanceof HTMLInputElement) return !['checkbox', 'radio', 'button'].includes(target.type);
  return target instanceof HTMLTextAreaElement || target instanceof HTMLSelectElement;
}
