import { ChangeDetectionStrategy, Component, computed, input, output, signal } from '@angular/core';

let fields = 0;

/**
 * A number that is typed or nudged. Enter or leaving the field takes it; nonsense is told and the old number stays;
 * arrow keys nudge by a step, with Shift by ten, with Alt by a tenth.
 */
@Component({
  selector: 'fl-number-field',
  template: `
    <label [attr.for]="id">{{ label() }}</label>
    <span class="box" [class.wrong]="fault()">
      <input
        #field
        [id]="id"
        type="text"
        inputmode="decimal"
        autocomplete="off"
        spellcheck="false"
        [value]="text()"
        [readonly]="readOnly()"
        [attr.aria-invalid]="fault() ? true : null"
        [attr.aria-describedby]="fault() ? id + '-fault' : null"
        (focus)="field.select()"
        (change)="take(field)"
        (keydown)="nudge($event, field)"
      />
      <span class="unit" aria-hidden="true">{{ unit() }}</span>
    </span>
    @if (fault()) {
      <span class="fault" role="alert" [id]="id + '-fault'">{{ fault() }}</span>
    }
  `,
  styleUrl: './number-field.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class NumberField {
  readonly label = input.required<string>();
  readonly value = input.required<number>();
  readonly unit = input('');
  readonly step = input(1);
  readonly min = input(-Infinity);
  readonly max = input(Infinity);
  /** Decimals shown; the number itself keeps all it has. */
  readonly digits = input(2);
  readonly readOnly = input(false);
  /** A number that was typed. */
  readonly typed = output<number>();
  /** A number that was nudged to; nudges in a row belong together. */
  readonly nudged = output<number>();

  protected readonly id = `fl-number-${++fields}`;
  protected readonly fault = signal('');
  protected readonly text = computed(() => shown(this.value(), this.digits()));

  protected take(field: HTMLInputElement): void {
    if (field.value === this.text()) return this.fault.set('');
    const value = Number(field.value.trim().replace(',', '.').replace('−', '-'));
    if (field.value.trim() === '' || !Number.isFinite(value)) {
      this.fault.set(`“${field.value.slice(0, 20)}” is no number; ${this.text()} was kept.`);
      field.value = this.text();
      return;
    }
    if (value < this.min() || value > this.max()) {
      this.fault.set(`${shown(this.min(), 1)} to ${shown(this.max(), 1)}; ${this.text()} was kept.`);
      field.value = this.text();
      return;
    }
    this.fault.set('');
    this.typed.emit(value);
    field.value = shown(value, this.digits());
  }

  protected nudge(event: KeyboardEvent, field: HTMLInputElement): void {
    if (event.key === 'Escape') {
      field.value = this.text();
      field.blur();
    }
    const direction = event.key === 'ArrowUp' ? 1 : event.key === 'ArrowDown' ? -1 : 0;
    if (direction === 0 || this.readOnly()) return;
    event.preventDefault();
    const size = this.step() * (event.shiftKey ? 10 : event.altKey ? 0.1 : 1);
    // Sums of tenths would grow a tail of binary noise.
    const value = Number((this.value() + direction * size).toFixed(6));
    this.fault.set('');
    this.nudged.emit(Math.min(Math.max(value, this.min()), this.max()));
  }
}

function shown(value: number, digits: number): string {
  const text = value.toFixed(digits);
  return text.includes('.') ? text.replace(/\.?0+$/, '').replace(/^-0$/, '0') : text;
}
