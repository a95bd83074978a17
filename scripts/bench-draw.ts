import { highsSolver } from '../src/adapters/solver/highs';
import { faultOf } from '../src/core/draw/allotment';
import { buildProgram, readGiven } from '../src/core/draw/build-program';
import { exampleAllotment } from '../src/core/draw/example-allotment';

/** Seconds of work (of this process alone, the worker's start too) for draws of 30 members, 40 stands and 200 conflicts. */
const GAP = 0.02;

for (let seed = 1; seed <= 5; seed++) {
  const allotment = exampleAllotment({ members: 30, stands: 40, conflicts: 200, seed });
  const built = buildProgram(allotment);
  const before = process.cpuUsage();
  const answer = await highsSolver.solve(built.program, { seconds: 30, gap: GAP, seed });
  const { user, system } = process.cpuUsage(before);
  const seconds = (user + system) / 1e6;
  if (answer.kind !== 'found') throw new Error(`draw ${seed}: ${answer.kind}`);
  const given = readGiven(allotment, built, answer.columns);
  const fault = faultOf(allotment, given);
  if (fault) throw new Error(`draw ${seed} breaks a rule: ${fault}`);
  const seated = given.filter((stand) => stand !== null).length;
  console.log(
    `draw ${seed}: ${seated} of 30 given a stand, gap ${(100 * answer.gap).toFixed(2)} %, ${seconds.toFixed(2)} s`,
  );
}
