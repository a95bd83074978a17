import { highsSolver } from '../src/adapters/solver/highs';
import { faultOf, placesOf } from '../src/core/draw/allotment';
import { buildProgram, readGiven } from '../src/core/draw/build-program';
import { exampleAllotment } from '../src/core/draw/example-allotment';
import { solveOptions } from '../src/core/draw/solve-options';

/** Seconds of work (of this process alone, the worker's start too) for draws of 30 members, 40 stands and 200 conflicts. */
async function bench(name: string, seeds: number, slots: number) {
  for (let seed = 1; seed <= seeds; seed++) {
    const allotment = exampleAllotment({ members: 30, stands: 40, conflicts: 200, seed, slots });
    const before = process.cpuUsage();
    const built = buildProgram(allotment);
    const answer = await highsSolver.solve(built.program, { ...solveOptions(`${seed}`), seed });
    const { user, system } = process.cpuUsage(before);
    const seconds = (user + system) / 1e6;
    if (answer.kind !== 'found') throw new Error(`draw ${seed}: ${answer.kind}`);
    const given = readGiven(allotment, built, answer.columns);
    const fault = faultOf(allotment, given);
    if (fault) throw new Error(`draw ${seed} breaks a rule: ${fault}`);
    const seated = given.filter((_, member) => placesOf(given, member).length > 0).length;
    const gap = (100 * answer.gap).toFixed(2);
    const sits = placesOf(given, null).length;
    console.log(
      `${name} ${seed}: ${sits} places to ${seated} of 30, gap ${gap} %${answer.cutBy ? ` (cut by ${answer.cutBy})` : ''}, ${seconds.toFixed(2)} s`,
    );
  }
}

await bench('one window', 12, 1);
await bench('three windows', 4, 3);
