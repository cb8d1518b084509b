import { type Picture, type View } from '#shared/render/picture';
import { referenceFrame } from '#shared/render/reference';
import { FramePool } from '../../../server/render/frame-pool';
import { difference, panorama } from '../../support/pictures';
import { renderPoses } from '../../support/render-poses';

describe('pictures on several threads', () => {
  let source: Picture;
  let pool: FramePool;

  beforeAll(async () => {
    source = await panorama('courtyard-1024x512.jpg');
  });
  beforeEach(() => {
    pool = new FramePool(2);
  });
  afterEach(() => pool.close());

  const render = (view: View): Promise<Uint8Array> =>
    pool.render(view, 'plain', rgba => Uint8Array.from(rgba));

  // Truth: the double-precision renderer, itself held against FFmpeg and three.js.
  it('are the reference, whatever their size, asked for all at once', async () => {
    await pool.setSource(source);
    const views = [...renderPoses(61, 37).slice(0, 4), ...renderPoses(160, 90).slice(4, 8)];
    const pictures = await Promise.all(views.map(render));
    views.forEach((view, i) => {
      expect(pictures[i]).toHaveLength(4 * view.width * view.height);
      expect(difference(pictures[i], referenceFrame(source, view)).largest).toBeLessThanOrEqual(3);
    });
  });

  it('say so when there is no source yet, and go on once there is', async () => {
    const [view] = renderPoses(32, 18);
    await expect(render(view)).rejects.toThrow('no source picture');
    await pool.setSource(source);
    await expect(render(view)).resolves.toHaveLength(4 * 32 * 18);
  });

  it('fail instead of hanging when the pool is closed under way', async () => {
    await pool.setSource(source);
    const waiting = pool.render({ ...renderPoses(4000, 4000)[0] }, 'export', () => 'done');
    const failed = expect(waiting).rejects.toThrow('ended before its picture was done');
    await pool.close();
    await failed;
  });
});
