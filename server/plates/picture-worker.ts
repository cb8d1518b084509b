import { allowOnlyOurFormats, makeVersions } from './make-versions';
import { type PictureTask } from './picture-report';

// A process of its own for each picture: whatever a hostile file does to the decoder, the server goes on, and the
// memory that decoding took is given back.
allowOnlyOurFormats();
process.once('message', (task: PictureTask) => {
  void makeVersions(task).then(report => {
    process.send?.(report, () => process.disconnect());
  });
});
process.once('disconnect', () => process.exit());
