/**
 * What the worker thread runs, as text: a bundler then neither looks for its file nor packs the solver. It finds the
 * solver in the folder the program was started from. The compiled solver is handed back for the next worker: what was made
 * fast while it ran stays fast.
 */
export const WORKER_CODE = `
const { createRequire } = require('node:module');
const { join } = require('node:path');
const { readFile } = require('node:fs/promises');
const { parentPort, workerData } = require('node:worker_threads');
const near = createRequire(join(process.cwd(), 'package.json'));
const load = near('highs');
const { model: data, options } = workerData;
const finite = (value) => (Number.isFinite(value) ? value : null);
async function compiled() {
  if (workerData.wasmModule) return workerData.wasmModule;
  const wasmModule = await WebAssembly.compile(await readFile(near.resolve('highs/runtime')));
  parentPort.postMessage({ wasmModule });
  return wasmModule;
}
compiled().then(async (wasmModule) => {
  const highs = await (load.default ?? load)({ wasmModule });
  const tell = ({ data }) => {
    parentPort.postMessage({
      progress: {
        seconds: data.running_time,
        value: finite(data.mip_primal_bound),
        bound: finite(data.mip_dual_bound),
      },
    });
  };
  highs.withModel((model) => {
    model.passModel(data);
    for (const [name, value] of Object.entries(options)) model.options.set(name, value);
    const { mipLogging, mipImprovingSolution } = highs.constants.callbackType;
    const { modelStatus } = model.run({ [mipLogging]: tell, [mipImprovingSolution]: tell });
    const { colValue } = model.getSolution();
    parentPort.postMessage({
      answer: {
        status: modelStatus,
        columns: model.info.get('primal_solution_status') === 2 ? Array.from(colValue) : null,
        value: finite(model.getObjectiveValue()),
        bound: finite(model.info.get('mip_dual_bound')),
      },
    });
  });
});
`;
