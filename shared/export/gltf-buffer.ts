import { base64FromBytes } from './base64-text';

/** glTF's number for 32-bit floats. */
const FLOAT = 5126;
const FLOAT_BYTES = 4;
const FLOATS_OF = { SCALAR: 1, VEC4: 4 } as const;

type AccessorType = keyof typeof FLOATS_OF;

interface Accessor {
  readonly bufferView: number;
  readonly componentType: number;
  readonly type: AccessorType;
  readonly count: number;
  readonly min?: readonly number[];
  readonly max?: readonly number[];
}

/**
 * The one buffer of a glTF file: rows of numbers, each with a view and an accessor of its own, laid one after the other
 * and written into the file itself as little-endian 32-bit floats.
 *
 * @see glTF 2.0 §3.6
 */
export class GltfBuffer {
  readonly #rows: Float64Array[] = [];
  readonly #accessors: Accessor[] = [];

  /** @returns the accessor's number */
  add(values: Float64Array, type: AccessorType): number {
    return this.#add(values, { type });
  }

  /**
   * Times of an animation, whose accessor has to say the least and the greatest.
   *
   * @param times rising, at least one
   * @returns the accessor's number
   */
  addTimes(times: Float64Array): number {
    const [min, max] = [times[0], times[times.length - 1]].map(time => [Math.fround(time)]);
    return this.#add(times, { type: 'SCALAR', min, max });
  }

  #add(values: Float64Array, said: Pick<Accessor, 'type' | 'min' | 'max'>): number {
    const count = values.length / FLOATS_OF[said.type];
    const bufferView = this.#rows.push(values) - 1;
    return this.#accessors.push({ bufferView, componentType: FLOAT, count, ...said }) - 1;
  }

  /** @returns the file's members that say the buffer; none where nothing was added, as glTF has no empty lists */
  members(): object {
    if (this.#rows.length === 0) return {};
    const bytes = this.#bytes();
    const uri = `data:application/octet-stream;base64,${base64FromBytes(bytes)}`;
    return {
      accessors: this.#accessors,
      bufferViews: this.#views(),
      buffers: [{ byteLength: bytes.length, uri }],
    };
  }

  #views(): object[] {
    let end = 0;
    return this.#rows.map(({ length }) => {
      const byteLength = length * FLOAT_BYTES;
      const byteOffset = end;
      end += byteLength;
      return { buffer: 0, byteOffset, byteLength };
    });
  }

  #bytes(): Uint8Array {
    const floats = this.#rows.reduce((sum, row) => sum + row.length, 0);
    const view = new DataView(new ArrayBuffer(floats * FLOAT_BYTES));
    let at = 0;
    for (const row of this.#rows) {
      for (const value of row) {
        view.setFloat32(at, value, true);
        at += FLOAT_BYTES;
      }
    }
    return new Uint8Array(view.buffer);
  }
}
