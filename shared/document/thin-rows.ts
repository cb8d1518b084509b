import { type Key } from '#schemas/move';
import { MOST_KEYS } from './readable-part';
import { ThinChords } from './thin-chords';
import { ThinLeg } from './thin-leg';
import { reachFrom } from './thin-reach';
import { isPlain, rowAfterMiss, rowAfterPlain } from './thin-skip';
import { settled } from './thin-settle';
import { reachOfSwings } from './thin-swings';
import { type ThinTable, thinTable, type Tolerance } from './thin-table';

/** Rows that are kept, or why there are none. */
export type Thinned =
  | {
      readonly kept: readonly number[];
      /** Whether fewer are known not to do. */
      readonly fewest: boolean;
      /** Legs between neighbouring whole rows that miss a row between two source frames. */
      readonly missing: number;
    }
  | {
      readonly kept?: undefined;
      /** Tolerances as many times as wide would do. */
      readonly factor: number;
    };

/** What the search may cost (`ThinLeg.compared`): a few seconds. */
const MOST_COMPARED = 25_000_000;

/** What `reachFrom` takes, in comparisons. */
const REACH_COST = 30;

/**
 * The fewest rows whose even arc legs keep every row within a tolerance, the first and the last whole row among them.
 *
 * A leg that fits does not make the shorter ones fit (with a whole turn more it may be another way), so all pairs of rows
 * count. The search goes out from the first row, leg by leg: what one leg reaches, what two reach, and so on, so the last
 * row is reached by the fewest legs. Pairs are passed over only where it is certain that they do not fit (`reachFrom`,
 * `reachOfSwings`, `rowAfterMiss`), or where no more legs reach the row than already did.
 *
 * The answer is exact for every table of up to 350 rows (n³/2 comparisons at worst), and for longer ones as long as 25
 * million comparisons of poses suffice, which they do unless the rows lie near the tolerance nearly everywhere. Where they
 * do not, the search goes on from the farthest row reached, each leg about as long as can be, and the answer says so. Of
 * sets of as many rows, one that follows the table closely is then taken (`settled`).
 *
 * @param keys rows at rising frames. Those between two source frames cannot be keys, but the legs keep to them too;
 *   except that neighbouring whole rows may always be joined, as nothing can be nearer
 */
export function thinRows(keys: readonly Key[], tolerance: Tolerance): Thinned {
  const table = thinTable(keys);
  const chords = new ThinChords(table);
  const leg = new ThinLeg(table, tolerance, chords);
  const search = new Search(table, tolerance, leg);
  const found = search.run();
  if (found.length <= MOST_KEYS) {
    const kept = settled(found, table, leg);
    const missing = kept.slice(1).filter((to, i) => !leg.fits(kept[i], to)).length;
    return { kept, fewest: search.exact, missing };
  }
  return { factor: enoughFactor(table, tolerance, chords) };
}

/** The least doubling of the tolerance with which long legs alone make a move; at half a turn any row is near enough. */
function enoughFactor(table: ThinTable, tolerance: Tolerance, chords: ThinChords): number {
  for (let factor = 2; ; factor *= 2) {
    const wider = {
      angleRad: factor * tolerance.angleRad,
      fovRad: factor * tolerance.fovRad,
      eye: factor * tolerance.eye,
    };
    const search = new Search(table, wider, new ThinLeg(table, wider, chords));
    const all = wider.angleRad >= Math.PI && wider.fovRad >= 2 * Math.PI && wider.eye >= 1;
    if (all || search.byLongLegs().length <= MOST_KEYS) return factor;
  }
}

class Search {
  /** Whether no shorter answer has been passed over. */
  exact = true;
  readonly #table: ThinTable;
  readonly #tolerance: Tolerance;
  readonly #leg: ThinLeg;
  /** Rows that can be keys. */
  readonly #whole: number[];
  /** For each row the row before it on the fewest legs there; −1 where it has not been reached. */
  readonly #before: Int32Array;
  /** For each row itself where it can be a key and has not been reached, else some later one; see {@link #open}. */
  readonly #next: Int32Array;
  readonly #swings: Int32Array;
  readonly #last: number;

  constructor(table: ThinTable, tolerance: Tolerance, leg: ThinLeg) {
    this.#table = table;
    this.#tolerance = tolerance;
    this.#leg = leg;
    this.#whole = table.keys.flatMap((key, row) => (Number.isInteger(key.frame) ? [row] : []));
    this.#before = new Int32Array(table.count).fill(-1);
    this.#next = Int32Array.from({ length: table.count + 1 }, (_, row) => Math.min(row + 1, table.count));
    for (const row of this.#whole) this.#next[row] = row;
    this.#swings = reachOfSwings(table, tolerance.angleRad);
    this.#last = this.#whole[this.#whole.length - 1];
  }

  /** @returns rows to keep; more than a move may have where there is no better answer */
  run(): number[] {
    const first = this.#whole[0];
    this.#next[first] = first + 1;
    let reached = [first];
    for (let keys = 1; reached.length > 0 && this.#before[this.#last] < 0 && keys < MOST_KEYS; keys++) {
      if (first === this.#last) return [first];
      reached = this.#legFurther(reached);
    }
    if (this.#before[this.#last] >= 0) return this.#wayTo(this.#last);
    this.exact = false;
    const farthest = this.#before.reduce((far, before, row) => (before >= 0 ? row : far), first);
    return [...this.#wayTo(farthest), ...this.byLongLegs(farthest).slice(1)];
  }

  /** Rows from one on, each leg about as long as it can be: tried at twice the length as long as it fits, then halved. */
  byLongLegs(from = this.#whole[0]): number[] {
    const rows = [from];
    const whole = this.#whole;
    for (let at = whole.indexOf(from); at < whole.length - 1;) {
      const fits = (to: number) => to === at + 1 || this.#leg.fits(whole[at], whole[to]);
      let low = at + 1;
      let high = at + 2;
      while (high < whole.length && fits(high)) {
        low = high;
        high = at + 2 * (high - at);
      }
      if (high >= whole.length && fits(whole.length - 1)) low = whole.length - 1;
      high = Math.min(high, whole.length);
      while (high - low > 1) {
        const middle = (low + high) >> 1;
        if (fits(middle)) low = middle;
        else high = middle;
      }
      at = low;
      rows.push(whole[at]);
    }
    return rows;
  }

  /** @returns the rows that one leg more reaches, the farthest first; none where the search has to stop */
  #legFurther(reached: readonly number[]): number[] {
    const further: number[] = [];
    if (reached.some(from => this.#reaches(from, this.#last))) return further;
    for (const from of reached) {
      if (this.#leg.compared > MOST_COMPARED) return [];
      this.#spread(from, further);
    }
    return further.sort((a, b) => b - a);
  }

  /** Adds the rows that have not been reached and that a leg from one row reaches. */
  #spread(from: number, further: number[]): void {
    const table = this.#table;
    const reach = reachFrom(from, table, this.#tolerance);
    const last = Math.min(reach.any, this.#swings[from]);
    this.#leg.compared += REACH_COST;
    const add = (to: number) => {
      this.#before[to] = from;
      this.#next[to] = to + 1;
      further.push(to);
    };
    const neighbour = this.#neighbour(from);
    if (this.#open(neighbour) === neighbour) add(neighbour);
    for (let to = this.#open(from + 1); to <= last && this.#leg.compared <= MOST_COMPARED;) {
      if (to > reach.plain && isPlain(table, from, to)) to = rowAfterPlain(from, to, table);
      else if (this.#leg.fits(from, to)) add(to++);
      else to = rowAfterMiss(this.#leg, from, to, table);
      to = this.#open(to);
    }
  }

  #reaches(from: number, to: number): boolean {
    const near = this.#leg.compared <= MOST_COMPARED && this.#swings[from] >= to;
    const fits = this.#neighbour(from) === to || (near && this.#leg.fits(from, to));
    if (fits) this.#before[to] = from;
    return fits;
  }

  /** @returns the next row after one that can be a key */
  #neighbour(row: number): number {
    let next = row + 1;
    while (next < this.#last && !Number.isInteger(this.#table.keys[next].frame)) next++;
    return next;
  }

  /** @returns the first row from `row` on that can be a key and has not been reached; the count where there is none */
  #open(row: number): number {
    const next = this.#next;
    let open = row;
    while (open < this.#table.count && next[open] !== open) open = next[open];
    // What has been passed need not be passed again.
    for (let at = row; at !== open && at < open;) {
      const then = next[at];
      next[at] = open;
      at = then;
    }
    return open;
  }

  #wayTo(row: number): number[] {
    const way = [row];
    for (let at = row; this.#before[at] >= 0; at = this.#before[at]) way.push(this.#before[at]);
    return way.reverse();
  }
}
