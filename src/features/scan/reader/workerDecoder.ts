import type { ReadingEffort } from '../../../../shared/reader/codeReader';
import { readReplySchema, type ReadJob } from './readerMessages';

export interface WorkerDecoder {
  /** Text of the code in the picture, or null. The picture's buffer is gone after the call. */
  decode(picture: ImageData, effort: ReadingEffort): Promise<string | null>;
  close(): void;
}

/** The decoding core in its own thread; pictures are answered in the order in which they were given. */
export function createWorkerDecoder(): WorkerDecoder {
  const worker = new Worker(new URL('./readerWorker.ts', import.meta.url), { type: 'module' });
  const waiting = new Map<
    number,
    { resolve: (text: string | null) => void; reject: (error: Error) => void }
  >();
  let lastId = 0;

  worker.addEventListener('message', (event: MessageEvent<unknown>) => {
    const { id, text } = readReplySchema.parse(event.data);
    waiting.get(id)?.resolve(text);
    waiting.delete(id);
  });
  const failAll = (message: string): void => {
    for (const { reject } of waiting.values()) reject(new Error(message));
    waiting.clear();
  };
  worker.addEventListener('error', () => failAll('The reader stopped working.'));

  return {
    decode: (picture, effort) =>
      new Promise((resolve, reject) => {
        const id = ++lastId;
        waiting.set(id, { resolve, reject });
        const rgba = picture.data.buffer;
        const job: ReadJob = { id, rgba, width: picture.width, height: picture.height, effort };
        worker.postMessage(job, [rgba]);
      }),
    close() {
      worker.terminate();
      failAll('The reader was closed.');
    },
  };
}
