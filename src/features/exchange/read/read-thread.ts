import { parentPort } from 'node:worker_threads';
import { readMapFile } from './read-file';

/** What the worker thread runs: one file in, what it holds out. */
parentPort?.once('message', (bytes: Uint8Array) => parentPort?.postMessage(readMapFile(bytes)));
