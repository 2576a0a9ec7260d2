import { on } from 'node:events';
import { join } from 'node:path';
import { isMainThread, parentPort, Worker, workerData } from 'node:worker_threads';
import type { HistoryOptions } from './build-history.js';
import { type DeliveryGroup, historyGroups } from './history-groups.js';

/** The groups of a history, made in a thread of their own while those before them are loaded. */
export async function* historyFromThread(options: HistoryOptions): AsyncGenerator<DeliveryGroup, void> {
  const worker = new Worker(join(__dirname, 'history-thread.js'), { workerData: options });
  try {
    for await (const [group] of on(worker, 'message', { close: ['exit'] })) yield group as DeliveryGroup;
  } finally {
    await worker.terminate();
  }
}

if (!isMainThread && parentPort) {
  for (const group of historyGroups(workerData as HistoryOptions)) parentPort.postMessage(group);
}
