import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  inject,
  input,
  signal,
  untracked,
  viewChild,
} from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatIconModule } from '@angular/material/icon';
import { MatProgressBarModule } from '@angular/material/progress-bar';
import { MatTooltipModule } from '@angular/material/tooltip';
import { Title } from '@angular/platform-browser';
import { Router, RouterLink } from '@angular/router';

import { type Plate } from '#schemas/api/plates';
import { framesCsv } from '#shared/export/csv';
import { frameRows } from '#shared/export/frames-table';
import { serialiseMove } from '#shared/document/serialise';
import { Session } from '../account/session';
import { Problem, problemFrom } from '../http/problem';
import { moveOnShot } from '../shots/move-on-shot';
import { ShotsApi } from '../shots/shots-api';
import { downloadText, fileNameOf } from '../ui/download';
import { ProblemNote } from '../ui/problem-note';
import { Chart } from './chart/chart';
import { FramedView } from './framed-view/framed-view';
import { Hand } from './hand/hand';
import { keystroke, releaseClicked } from './keystrokes';
import { Legs } from './legs/legs';
import { PlatePictures } from './plate-pictures';
import { DesignerSession } from './session/designer-session';
import { type Draft, Drafts } from './session/drafts';
import { Saving } from './session/saving';
import { openDocument, rename } from './state/commands';
import { Player } from './transport/player';
import { Transport } from './transport/transport';

/** The move designer: pictures above, legs in the middle, the key or leg in hand below. */
@Component({
  selector: 'fl-designer',
  imports: [
    MatButtonModule,
    MatIconModule,
    MatProgressBarModule,
    MatTooltipModule,
    RouterLink,
    Chart,
    FramedView,
    Hand,
    Legs,
    ProblemNote,
    Transport,
  ],
  providers: [DesignerSession, Saving, Player, PlatePictures],
  templateUrl: './designer.html',
  styleUrl: './designer.scss',
  host: {
    class: 'fl-dark-room',
    '(click)': 'release($event)',
    '(document:keydown)': 'press($event)',
    '(window:beforeunload)': 'warn($event)',
  },
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class Designer {
  readonly crewId = input.required<string>();
  readonly moveId = input.required<string>();

  readonly #api = inject(ShotsApi);
  readonly #account = inject(Session);
  readonly #drafts = inject(Drafts);
  readonly #router = inject(Router);
  readonly #title = inject(Title);
  readonly #player = inject(Player);
  readonly #pictures = inject(PlatePictures);
  protected readonly framedView = viewChild(FramedView);
  protected readonly session = inject(DesignerSession);
  protected readonly saving = inject(Saving);
  protected readonly loading = signal(true);
  protected readonly problem = signal<Problem | undefined>(undefined);
  protected readonly draft = signal<Draft | undefined>(undefined);
  readonly #plates = signal<readonly Plate[]>([]);
  /** The plate in force at the playhead: the last that stands at or before it. */
  readonly #plateHere = computed(() => {
    const plates = this.#plates();
    return plates.filter(plate => plate.frame <= this.session.playhead()).at(-1) ?? plates[0];
  });
  protected readonly noPlate = computed(() => this.ready() && this.#plates().length === 0);
  /** Which picture has the whole width, if one has. */
  protected readonly wide = signal<'none' | 'chart' | 'view'>('none');
  protected readonly ready = computed(() => this.session.shot() !== undefined);

  constructor() {
    effect(() => {
      const [crewId, moveId] = [this.crewId(), this.moveId()];
      untracked(() => void this.#open(crewId, moveId));
    });
    effect(() => {
      const plate = this.#plateHere();
      const widest = this.framedView()?.widestPicture();
      if (plate && widest !== undefined) untracked(() => void this.#showPlate(plate, widest));
    });
    effect(() => {
      this.session.saved();
      untracked(() => this.saving.keepDraft());
    });
    effect(() => {
      if (this.ready()) this.#title.setTitle(`${this.session.move().title || 'Move'} · Fairlead`);
    });
  }

  protected press(event: KeyboardEvent): void {
    keystroke(event, { session: this.session, player: this.#player, saving: this.saving });
  }

  protected readonly release = releaseClicked;

  protected warn(event: BeforeUnloadEvent): void {
    if (this.saving.unsaved()) event.preventDefault();
  }

  protected rename(title: string): void {
    this.session.run(rename(title.slice(0, 200)));
  }

  protected toggleWide(which: 'chart' | 'view'): void {
    this.wide.update(now => (now === which ? 'none' : which));
  }

  protected downloadDocument(): void {
    const move = this.session.saved();
    downloadText([serialiseMove(move)], `${fileNameOf(move.title)}.move.json`, 'application/json');
  }

  protected downloadFrames(): void {
    const move = this.session.saved();
    downloadText(framesCsv(frameRows(move, 'delivered')), `${fileNameOf(move.title)}.frames.csv`, 'text/csv');
  }

  /** A file replaces keys, deliverables and title in one step that can be undone; a bad one replaces nothing. */
  protected async openFile(files: FileList | null): Promise<void> {
    const file = files?.[0];
    const shot = this.session.shot();
    if (!file || !shot) return;
    const checked = moveOnShot(await file.text(), shot);
    if (checked.ok) {
      this.problem.set(undefined);
      this.session.run(openDocument(checked.document));
      return;
    }
    const title = `${file.name} cannot be opened on this shot.`;
    this.problem.set(
      new Problem(
        'invalid-file',
        title,
        0,
        'The move here is untouched. What is wrong with the file:',
        checked.faults,
      ),
    );
  }

  protected takeTheirs(): void {
    const theirs = this.saving.theirs();
    const shot = this.session.shot();
    if (theirs && shot) this.session.open(this.saving.opened(theirs), shot, this.session.readOnly());
  }

  protected async keepAsCopy(): Promise<void> {
    const id = await this.saving.keepAsCopy();
    if (id) await this.#router.navigate(['/crews', this.crewId(), 'moves', id]);
  }

  protected restoreDraft(draft: Draft): void {
    this.session.run(openDocument(draft.document));
    this.draft.set(undefined);
  }

  protected discardDraft(): void {
    this.#drafts.forget(this.moveId());
    this.draft.set(undefined);
  }

  async #showPlate(plate: Plate, widest: number): Promise<void> {
    try {
      await this.#pictures.show(plate, widest);
    } catch (error) {
      this.problem.set(problemFrom(error));
    }
  }

  async #open(crewId: string, moveId: string): Promise<void> {
    this.loading.set(true);
    this.problem.set(undefined);
    try {
      const move = await this.#api.getMove(crewId, moveId);
      const [shot, plates] = await Promise.all([
        this.#api.getShot(crewId, move.shotId),
        this.#api.getPlates(crewId, move.shotId),
      ]);
      const document = this.saving.opened(move);
      const draft = this.#drafts.find(moveId);
      this.session.open(document, shot, !this.#account.may(crewId, 'edit'));
      if (draft && serialiseMove(draft.document) !== serialiseMove(document)) this.draft.set(draft);
      this.loading.set(false);
      this.#plates.set(plates);
    } catch (error) {
      this.problem.set(problemFrom(error));
    } finally {
      this.loading.set(false);
    }
  }
}
