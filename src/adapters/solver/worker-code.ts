/**
 * What the worker thread runs, as text: a bundler then neither looks for its file nor packs the solver. It finds the
 * solver in the folder the program was started from.
 */
export const WORKER_CODE = `
const { createRequire } = require('node:module');
const { join } = require('node:path');
const { parentPort, workerData } = require('node:worker_threads');
const load = createRequire(join(process.cwd(), 'package.json'))('highs');
const { model: data, options } = workerData;
(load.default ?? load)().then((highs) => {
  highs.withModel((model) => {
    model.passModel(data);
    for (const [name, value] of Object.entries(options)) model.options.set(name, value);
    const { modelStatus } = model.run();
    const { colValue } = model.getSolution();
    const finite = (value) => (Number.isFinite(value) ? value : null);
    parentPort.postMessage({
      status: modelStatus,
      columns: model.info.get('primal_solution_status') === 2 ? Array.from(colValue) : null,
      value: finite(model.getObjectiveValue()),
      bound: finite(model.info.get('mip_dual_bound')),
    });
  });
});
`;
