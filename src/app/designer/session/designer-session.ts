import { computed, Injectable, signal } from '@angular/core';

import { type Shot } from '#schemas/api/shots';
import { type MoveDocument } from '#schemas/move';
import { DEG_PER_RAD, RAD_PER_DEG } from '#shared/conventions';
import { shotTimes } from '#shared/document/shot-times';
import { compileMove } from '#shared/path/compile';
import { POSE_SIZE } from '#shared/path/compiled-move';
import { quatFromYawPitchRoll } from '#shared/rotation/yaw-pitch-roll';
import { type Command, keyAt, keySelection, type Look } from '../state/commands';
import {
  type EditorState,
  NOTHING_SELECTED,
  openState,
  redo,
  select,
  type Selection,
  transact,
  type Transaction,
  undo,
} from '../state/editor-state';
import { applyStep } from '../state/steps';

const EMPTY: MoveDocument = {
  format: 'fairlead.move',
  version: 1,
  title: '',
  shot: { title: '', rate: { num: 24, den: 1 }, frames: 1, speed: 1, source: { width: 6144, height: 3072 } },
  deliverables: [{ name: 'Wide', width: 1920, height: 1080 }],
  keys: [{ frame: 0, yaw: 0, pitch: 0, roll: 0, fov: 90, eye: 0 }],
};

/** A look that the framed view has been turned to and that stands on no key. */
export interface PoseInHand {
  readonly look: Look;
}

/**
 * The designer's one store: the document and its history, what is selected, where the playhead stands, and what is being
 * dragged. Components read its signals and change it by commands alone.
 *
 * A drag is a preview: a transaction that is shown but not done until it is let go, so that one gesture is one step of
 * the history, and Escape leaves no trace.
 */
@Injectable()
export class DesignerSession {
  readonly #state = signal<EditorState>(openState(EMPTY));
  readonly #preview = signal<Transaction | undefined>(undefined);
  readonly #shot = signal<Shot | undefined>(undefined);

  readonly readOnly = signal(true);
  readonly shot = this.#shot.asReadonly();
  /** The document as saved or to be saved. */
  readonly saved = computed(() => this.#state().move);
  /** The document as shown: with what is being dragged. */
  readonly move = computed(
    () => this.#preview()?.steps.reduce(applyStep, this.#state().move) ?? this.#state().move,
  );
  readonly selection = computed(() => this.#preview()?.selection ?? this.#state().selection);
  readonly undoLabel = computed(() => this.#state().past.at(-1)?.label);
  readonly redoLabel = computed(() => this.#state().future.at(0)?.label);

  readonly times = computed(() => shotTimes(this.move().shot));
  readonly compiled = computed(() => compileMove(this.move()));

  /** Source frame; whole but for playback at speeds that are not. */
  readonly playhead = signal(0);
  readonly hand = signal<PoseInHand | undefined>(undefined);

  /** The key that stands at the playhead. */
  readonly keyHere = computed(() => keyAt(this.move(), this.playhead()));
  readonly selectedKey = computed(() => {
    const [frame] = this.selection().keys;
    return frame === undefined ? undefined : keyAt(this.move(), frame);
  });
  /** The key whose leg is selected. */
  readonly selectedLeg = computed(() => {
    const { leg } = this.selection();
    return leg === undefined ? undefined : keyAt(this.move(), leg);
  });

  /** What the framed view shows: the pose in hand, else the path's. */
  readonly look = computed((): Look => this.hand()?.look ?? this.lookAt(this.playhead()));
  readonly pose = computed(() => poseOf(this.look()));

  open(document: MoveDocument, shot: Shot, readOnly: boolean): void {
    const opened = openState(document);
    this.#state.set(select(opened, keySelection(document.keys[0].frame)));
    this.#preview.set(undefined);
    this.#shot.set(shot);
    this.readOnly.set(readOnly);
    this.hand.set(undefined);
    this.playhead.set(document.keys[0].frame);
  }

  /** The numbers of the path at a source frame. */
  lookAt(frame: number): Look {
    const compiled = this.compiled();
    const pose = compiled.poseAt(new Float64Array(POSE_SIZE), frame);
    const [yaw, pitch, roll] = compiled.anglesAt(new Float64Array(3), frame);
    return { yaw, pitch, roll, fov: pose[4] * DEG_PER_RAD, eye: pose[5] };
  }

  /** Whether a command would apply now; for buttons that are grey when it would not. */
  can(command: Command): boolean {
    return !this.readOnly() && command(this.#state());
  }

  /** @returns whether it applied */
  run(command: Command): boolean {
    if (this.readOnly()) return false;
    this.#preview.set(undefined);
    return command(this.#state(), transaction =>
      this.#state.update(state => transact(state, transaction, Date.now())),
    );
  }

  /** Shows what a command would do, without doing it; each call stands on the document, not on the call before. */
  preview(command: Command): void {
    if (this.readOnly()) return;
    let shown: Transaction | undefined;
    command(this.#state(), transaction => (shown = transaction));
    this.#preview.set(shown);
  }

  /** Does what is previewed. */
  commit(): void {
    const transaction = this.#preview();
    this.#preview.set(undefined);
    if (transaction) this.#state.update(state => transact(state, withoutMerge(transaction), Date.now()));
  }

  cancel(): void {
    this.#preview.set(undefined);
  }

  undo(): void {
    this.cancel();
    if (!this.readOnly()) this.#state.update(undo);
  }

  redo(): void {
    this.cancel();
    if (!this.readOnly()) this.#state.update(redo);
  }

  select(selection: Selection): void {
    this.#state.update(state => select(state, selection));
  }

  /** Takes a key in hand and goes to it. */
  goToKey(frame: number): void {
    this.hand.set(undefined);
    this.select({ keys: [frame], leg: undefined });
    this.seek(frame);
  }

  selectNothing(): void {
    this.select(NOTHING_SELECTED);
  }

  /** Puts the playhead on a source frame of the shot. */
  seek(frame: number): void {
    this.playhead.set(Math.min(Math.max(frame, 0), this.move().shot.frames - 1));
  }
}

/** A drag is one step of its own, however soon it follows another. */
function withoutMerge({ mergeKey: _key, ...transaction }: Transaction): Transaction {
  return transaction;
}

function poseOf({ yaw, pitch, roll, fov, eye }: Look): Float64Array {
  const pose = new Float64Array(POSE_SIZE);
  quatFromYawPitchRoll(pose, yaw * RAD_PER_DEG, pitch * RAD_PER_DEG, roll * RAD_PER_DEG);
  pose[4] = fov * RAD_PER_DEG;
  pose[5] = eye;
  return pose;
}
