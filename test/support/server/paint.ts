// `node --import tsx paint.ts WIDTH VARIANT`: a painting on standard output. A process of its own, since Jest's sandbox
// makes every `Math` a slow look-up, and a painting has a billion of them.
import { paintVesperHaven } from '../../../seeds/vesper-haven/paint';

const [width, variant] = process.argv.slice(2);
if (variant !== 'blue-hour' && variant !== 'deep-night') throw new Error(`No variant ${variant}`);
void paintVesperHaven({ width: Number(width), variant }).then(picture => process.stdout.write(picture));
