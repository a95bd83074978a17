import { prepareGround } from '../src/core/rank';
import type { WeekInput } from '../src/core/rank-input';
import { scentGround } from '../src/core/scent/scent-ground';
import type { Verdict } from '../src/core/verdict-types';
import { rankWeek } from '../src/core/week';
import { makeWorld } from './bench-plain/make-world';
import { type PlainSit, plainSit } from './bench-plain/sit-plain';

/** Aims of the design: all stands of a week at once, and how much better than the straight line. */
const AIM_MS = 150;
const AIM_TIMES = 30;

/** Milliseconds of this process's own work: other work on the machine is not counted. */
function cpuMs(work: () => void): number {
  const before = process.cpuUsage();
  work();
  const { user, system } = process.cpuUsage(before);
  return (user + system) / 1000;
}

function median(values: number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.floor(sorted.length / 2)] ?? Number.NaN;
}

function times(n: number, work: () => void): number {
  return median(Array.from({ length: n }, () => cpuMs(work)));
}

/** Greatest difference as a share of the plain answer; answers under `floor` are compared as if they were that large. */
class Worst {
  readonly most = new Map<string, number>();
  add(name: string, fast: number, plain: number, floor: number): void {
    const off = Math.abs(fast - plain) / Math.max(Math.abs(plain), floor);
    this.most.set(name, Math.max(this.most.get(name) ?? 0, off));
  }
}

function compare(worst: Worst, v: Verdict, p: PlainSit): void {
  worst.add('pressure', v.pressure, p.pressure, 1e-3);
  worst.add('promise', v.promise, 100 * p.promise, 1);
  worst.add('arc hold (table)', v.arcHold?.shareOfTime ?? Number.NaN, p.shareOfTime, 0.01);
  worst.add('winded (table)', v.windedChance ?? Number.NaN, p.windedChance, 0.01);
  worst.add('walk in (table)', v.approach?.inChance ?? Number.NaN, p.inChance, 0.01);
  worst.add('walk out (table)', v.approach?.outChance ?? Number.NaN, p.outChance, 0.01);
  worst.add('quiet (table)', v.quiet, 100 * p.quiet, 1);
  worst.add('score (table)', v.score, p.score, 1);
}

/** Runs the plain version on every `stride`-th sit, compares, and answers its milliseconds for all of them. */
function againstPlain(world: WeekInput, stride: number, worst: Worst): number {
  const { forecast } = world;
  if (!forecast) throw new Error('the made-up world has a forecast');
  const ground = prepareGround(world);
  const columns = rankWeek(world, ground);
  const scent = scentGround(world.features, world.settings.scent);
  const tried = world.stands.flatMap((stand) => columns.map(({ window, verdicts }) => ({ stand, window, verdicts })));
  const some = tried.filter((_, i) => i % stride === 0);
  let ms = 0;
  for (const { stand, window, verdicts } of some) {
    let plain: PlainSit | null = null;
    ms += cpuMs(() => {
      plain = plainSit(world, stand, window, forecast, scent, ground.usesIn);
    });
    const fast = verdicts.find((v) => v.standId === stand.id);
    if (fast && plain) compare(worst, fast, plain);
  }
  return (ms * tried.length) / some.length;
}

function main(): void {
  const world = makeWorld(100, 300);
  const ground = prepareGround(world);
  const [first = world.windows[0]] = world.windows;
  if (!first) throw new Error('the made-up world has windows');
  console.log(
    `Node ${process.version}; 100 stands x ${world.windows.length} windows, 300 features, 200 approach points`,
  );
  console.log('Medians of processor time, helper threads of garbage collection counted; the work is on one thread.\n');
  for (let i = 0; i < 4; i++) rankWeek(world, prepareGround(world));
  const prepare = times(7, () => prepareGround(world));
  const fresh = times(7, () => rankWeek(world, prepareGround(world)));
  rankWeek(world, ground);
  const ready = times(15, () => rankWeek(world, ground));
  const one = times(15, () => rankWeek({ ...world, windows: [first], detail: 'full' }, ground));
  console.log(`ground laid out            ${prepare.toFixed(0)} ms`);
  console.log(`week, ground laid out anew ${fresh.toFixed(0)} ms`);
  console.log(`week, ground ready         ${ready.toFixed(0)} ms   (aim ${AIM_MS})`);
  console.log(`one window in full         ${one.toFixed(0)} ms`);
  const worst = new Worst();
  const plain = againstPlain(world, 23, worst);
  console.log(`plain straight line        ${plain.toFixed(0)} ms   (from every 23rd sit)`);
  console.log(
    `ratio                      ${(plain / ready).toFixed(0)} x ready, ${(plain / fresh).toFixed(0)} x anew   (aim ${AIM_TIMES})`,
  );
  console.log(`peak memory                ${(process.resourceUsage().maxRSS / 1024).toFixed(0)} MB\n`);
  console.log('greatest difference from the plain version, relative:');
  for (const [name, off] of worst.most) console.log(`  ${name.padEnd(18)} ${off.toExponential(1)}`);
  console.log('\nstands  ms anew  ms ready');
  for (const n of [25, 50, 100, 200]) {
    const w = makeWorld(n, 300);
    const g = prepareGround(w);
    rankWeek(w, g);
    const anew = times(5, () => rankWeek(w, prepareGround(w)));
    console.log(
      `${String(n).padStart(6)}  ${anew.toFixed(0).padStart(7)}  ${times(7, () => rankWeek(w, g))
        .toFixed(0)
        .padStart(8)}`,
    );
  }
}

main();
