import { Injectable } from '@angular/core';

import { type MoveDocument } from '#schemas/move';
import { checkMove } from '#shared/document/validate';

/** Work that was not saved, and the revision that it was made on. */
export interface Draft {
  readonly revision: number;
  readonly document: MoveDocument;
}

const PREFIX = 'fairlead.draft.';

/** Unsaved work, kept in this browser until it is saved. Where the browser keeps nothing, neither does this. */
@Injectable({ providedIn: 'root' })
export class Drafts {
  keep(moveId: string, draft: Draft): void {
    try {
      localStorage.setItem(PREFIX + moveId, JSON.stringify(draft));
    } catch {
      // Full or forbidden: the page still warns before it is left with unsaved changes.
    }
  }

  find(moveId: string): Draft | undefined {
    try {
      const draft: unknown = JSON.parse(localStorage.getItem(PREFIX + moveId) ?? 'null');
      if (typeof draft !== 'object' || draft === null || !('document' in draft) || !('revision' in draft))
        return undefined;
      const checked = checkMove(draft.document);
      return checked.ok && typeof draft.revision === 'number'
        ? { revision: draft.revision, document: checked.document }
        : undefined;
    } catch {
      return undefined;
    }
  }

  forget(moveId: string): void {
    try {
      localStorage.removeItem(PREFIX + moveId);
    } catch {
      // Forbidden: then nothing was kept either.
    }
  }
}
