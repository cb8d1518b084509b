import { computed, inject, Injectable, signal } from '@angular/core';

import { type Move } from '#schemas/api/moves';
import { type MoveDocument } from '#schemas/move';
import { serialiseMove } from '#shared/document/serialise';
import { checkMove } from '#shared/document/validate';
import { Problem, problemFrom } from '../../http/problem';
import { ShotsApi } from '../../shots/shots-api';
import { DesignerSession } from './designer-session';
import { Drafts } from './drafts';

/** What is stored on the server, and whether the designer has more. */
type Stored = Pick<Move, 'id' | 'crewId' | 'shotId' | 'revision'> & { readonly document: MoveDocument };

/** Saves the move, revision by revision; nothing is overwritten that somebody else has saved meanwhile. */
@Injectable()
export class Saving {
  readonly #api = inject(ShotsApi);
  readonly #session = inject(DesignerSession);
  readonly #drafts = inject(Drafts);
  readonly #stored = signal<Stored | undefined>(undefined);

  readonly busy = signal(false);
  readonly problem = signal<Problem | undefined>(undefined);
  /** The move as somebody else saved it, where our save was refused for that. */
  readonly theirs = signal<Move | undefined>(undefined);
  /** The document itself tells: editing makes another, undoing everything brings the same back. */
  readonly unsaved = computed(() => {
    const stored = this.#stored();
    return (
      stored !== undefined &&
      this.#session.saved() !== stored.document &&
      !same(this.#session.saved(), stored.document)
    );
  });
  readonly state = computed(() => {
    if (this.#session.readOnly()) return 'look only';
    if (this.busy()) return 'saving…';
    if (this.theirs()) return 'changed elsewhere';
    if (this.problem()) return 'not saved';
    return this.unsaved() ? 'unsaved changes' : 'saved';
  });

  /** Takes what the server holds as saved. @throws Problem where it is no document that this client reads */
  opened(move: Move): MoveDocument {
    const checked = checkMove(move.document);
    if (!checked.ok) {
      const detail =
        'It was left as it is. It may have been made by a newer version of Fairlead; load the page again.';
      throw new Problem('invalid-document', 'This move cannot be read here.', 0, detail, checked.faults);
    }
    const { id, crewId, shotId, revision } = move;
    this.#stored.set({ id, crewId, shotId, revision, document: checked.document });
    this.theirs.set(undefined);
    this.problem.set(undefined);
    return checked.document;
  }

  async save(): Promise<void> {
    const stored = this.#stored();
    const document = this.#session.saved();
    if (!stored || this.busy() || this.#session.readOnly()) return;
    this.busy.set(true);
    this.problem.set(undefined);
    try {
      const { revision } = await this.#api.saveMove(stored.crewId, stored.id, stored.revision, document);
      this.#stored.set({ ...stored, revision, document });
      this.theirs.set(undefined);
      if (!this.unsaved()) this.#drafts.forget(stored.id);
    } catch (error) {
      this.#refused(problemFrom(error));
    } finally {
      this.busy.set(false);
    }
  }

  /** @returns the new move's id: what is in the designer, beside what somebody else saved */
  async keepAsCopy(): Promise<string | undefined> {
    const stored = this.#stored();
    if (!stored) return undefined;
    const document = {
      ...this.#session.saved(),
      title: `${this.#session.saved().title} (copy)`.slice(0, 200),
    };
    try {
      const move = await this.#api.createMove(stored.crewId, stored.shotId, { document });
      this.#drafts.forget(stored.id);
      return move.id;
    } catch (error) {
      this.#refused(problemFrom(error));
      return undefined;
    }
  }

  /** Keeps what is not saved in this browser, so that nothing is lost if the tab dies. */
  keepDraft(): void {
    const stored = this.#stored();
    if (!stored || this.#session.readOnly()) return;
    if (this.unsaved())
      this.#drafts.keep(stored.id, { revision: stored.revision, document: this.#session.saved() });
    else this.#drafts.forget(stored.id);
  }

  #refused(problem: Problem): void {
    this.problem.set(problem);
    if (problem.status === 412 && isMove(problem.current)) this.theirs.set(problem.current);
  }
}

function isMove(value: unknown): value is Move {
  return typeof value === 'object' && value !== null && 'revision' in value && 'document' in value;
}

function same(a: MoveDocument, b: MoveDocument): boolean {
  return serialiseMove(a) === serialiseMove(b);
}
