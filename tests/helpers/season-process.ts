import { type ChildProcess, spawn } from 'node:child_process';
import { once } from 'node:events';
import { createInterface } from 'node:readline';
import type { SeasonOrder } from './season-worker';

/** One of the processes of a simulated season, ended and started anew as often as wanted. */
export class SeasonProcess {
  tally: Record<string, number> = {};
  kills = 0;
  #child: ChildProcess | null = null;
  #waiting = new Map<string, () => void>();
  #errors = '';
  #doings = 0;
  #killAtDoing: number | null = null;
  #gone: Promise<unknown> = Promise.resolve();

  constructor(
    private readonly order: SeasonOrder,
    private readonly env: Record<string, string>,
  ) {}

  async start(): Promise<void> {
    const args = ['--import', 'tsx', '--conditions=react-server', 'tests/helpers/season-worker.ts'];
    const child = spawn(process.execPath, [...args, JSON.stringify(this.order)], {
      env: { ...process.env, ...this.env },
      stdio: ['pipe', 'pipe', 'pipe'],
    });
    this.#child = child;
    this.#gone = once(child, 'exit');
    child.stderr.on('data', (chunk) => {
      this.#errors += chunk;
    });
    // A killed process leaves its pipe broken.
    child.stdin.on('error', () => undefined);
    createInterface({ input: child.stdout }).on('line', (line) => this.#heard(line));
    await this.#wait('ready');
  }

  #heard(line: string): void {
    if (line.startsWith('doing')) {
      this.#doings += 1;
      if (this.#doings === this.#killAtDoing) this.kill();
    } else if (line.startsWith('tally')) {
      this.tally = JSON.parse(line.slice('tally '.length));
      this.#waiting.get('tally')?.();
    } else {
      this.#waiting.get(line)?.();
    }
  }

  /** Resolves true when the line has come, false when the process ended before; fails when it ended by itself. */
  async #wait(line: string): Promise<boolean> {
    const came = new Promise<true>((done) => {
      this.#waiting.set(line, () => done(true));
    });
    const ended = this.#gone.then(() => false as const);
    const kills = this.kills;
    const result = await Promise.race([came, ended]);
    this.#waiting.delete(line);
    if (!result && this.kills === kills) throw new Error(`A process of the season ended by itself:\n${this.#errors}`);
    return result;
  }

  /** Lives one hour; false: it was killed in it. */
  async live(at: number, killAtDoing: number | null = null): Promise<boolean> {
    this.#doings = 0;
    this.#killAtDoing = killAtDoing;
    const lived = this.#wait(`lived ${at}`);
    this.#child?.stdin?.write(`${at}\n`);
    return lived;
  }

  /** As `kill -9`: nothing is finished, flushed or given back. */
  kill(): void {
    this.kills += 1;
    this.#child?.kill('SIGKILL');
  }

  async end(): Promise<void> {
    const told = this.#wait('tally');
    this.#child?.stdin?.end('end\n');
    await told;
    await this.#gone;
  }
}
