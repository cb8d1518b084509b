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
  // A focused button is pressed by the space bar; elsewhere it plays.
  if (!action || (key === ' ' && event.target instanceof HTMLButtonElement)) return false;
  event.preventDefault();
  action(hands);
  return true;
}

function isTyping(target: EventTarget | null): boolean {
  if (target instanceof HTMLInputElement) return !['checkbox', 'radio', 'button'].includes(target.type);
  return target instanceof HTMLTextAreaElement || target instanceof HTMLSelectElement;
}
