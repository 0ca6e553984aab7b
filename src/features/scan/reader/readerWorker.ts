import { createCodeReader } from '../../../../shared/reader/codeReader';
import { grayFromRgba } from '../../../../shared/reader/grayImage';
import { readJobSchema, type ReadReply } from './readerMessages';

/** Decoding away from the page's own thread, so that picture and buttons never stutter. */
const reader = createCodeReader();

addEventListener('message', (event: MessageEvent<unknown>) => {
  const job = readJobSchema.parse(event.data);
  const picture = grayFromRgba({
    data: new Uint8ClampedArray(job.rgba),
    width: job.width,
    height: job.height,
  });
  const reply: ReadReply = { id: job.id, text: reader.read(picture, job.effort)?.text ?? null };
  postMessage(reply);
});
