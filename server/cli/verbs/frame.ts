import { FramePool } from '../../render/frame-pool';
import { framedViews } from '../../render/framed-views';
import { savePicture } from '../../render/save-picture';
import { atOption, openSource, widthOption } from '../picture-options';
import { readMove } from '../read-document';
import { readWords, UsageError, wanted } from '../usage';

/** `frame FILE --source PANO.jpg --at FRAME [--width N] [--deliverable NAME] --out PIC.png`: one framed picture. */
export async function frame(args: readonly string[]): Promise<number> {
  const words = readWords(args, ['source', 'at', 'width', 'deliverable', 'out']);
  const out = wanted(words, 'out');
  const sourceFile = wanted(words, 'source');
  const widthPx = widthOption(words);
  const move = readMove(words.file);
  const at = atOption(words, move.shot.frames);
  const view = framedViews(move, words.options.get('deliverable'), { widthPx })(at);
  const source = await openSource(sourceFile);
  const pool = new FramePool(2);
  try {
    await pool.setSource(source);
    await pool.render(view, 'export', rgba => savePicture(out, { ...view, rgba }));
  } catch (error) {
    throw new UsageError(`${out} was not written: ${error instanceof Error ? error.message : String(error)}`);
  } finally {
    await pool.close();
  }
  return 0;
}
