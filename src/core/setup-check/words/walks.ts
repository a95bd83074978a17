import type { WindowName } from '../../condition-types';
import type { TimeOfDay } from '../../ground-types';
import { listText } from './parts';

type Leg = 'in' | 'out';

const walkedAt: Record<TimeOfDay, string> = {
  night: 'in the dark',
  dawn: 'at first light',
  morning: 'in the morning',
  midday: 'at midday',
  afternoon: 'in the afternoon',
  dusk: 'at last light',
};
const later: Record<WindowName, string> = { morning: 'half an hour after daybreak', evening: 'at midday' };

/** A place beside a walk. Others are ways told with it, each with its stand. */
export const BESIDE_WORDS = {
  /** `gap` null: it lies on the walk. */
  text: (x: { feature: string; gap: string | null; leg: Leg; way: string; stand: string; away: string }) =>
    `${x.feature} lies ${x.gap === null ? 'on' : `${x.gap} from`} the walk ${x.leg} by ${x.way} to ${x.stand}, ${x.away} of the seat`,
  why: (x: { leg: Leg; window: WindowName; time: TimeOfDay; inHundred: number; others: readonly string[] }) =>
    `The walk ${x.leg} for the ${x.window} passes it ${walkedAt[x.time]}, when deer are there ${x.inHundred} times in a hundred.${x.others.length > 0 ? ` So does ${listText(x.others)}.` : ''}`,
  otherWay: (leg: Leg, stand: string, way: string) => `Walk ${leg} to ${stand} by ${way} instead`,
  walkLater: (feature: string, window: WindowName) => `Walk in past ${feature} only ${later[window]}`,
  move: (feature: string, way: string) => `Move ${feature} off ${way}`,
  layRound: (way: string, feature: string) => `Lay ${way} round ${feature}`,
  screen: (way: string, feature: string) => `Screen ${way} from ${feature}`,
} as const;

export const WAY_WORDS = {
  upwind: (x: { way: string; beds: readonly string[]; share: number; stand: string; lines: readonly string[] }) =>
    `${x.way} runs upwind of ${listText(x.beds)} on ${x.share} % of the winds ${x.stand} is hunted on${x.lines.length > 0 ? `, and crosses ${listText(x.lines)}` : ''}`,
  crosses: (way: string, lines: readonly string[], away: string, stand: string) =>
    `${way} crosses ${listText(lines)} ${away} of ${stand}`,
  whyUpwind: 'Scent of the walk goes into the beds before the sit begins, whatever the seat itself does.',
  whyCrosses: 'Ground scent stays where a person crosses: deer that come along the line later stop at it or turn.',
  soDoOthers: (others: readonly string[]) => `So does ${listText(others)}, at the same place.`,
  otherWay: (way: string, stand: string, other: string) => `Give up ${way} and walk to ${stand} by ${other}`,
  layDownwind: (way: string, bed: string) => `Lay ${way} so that it stays downwind of ${bed}`,
  layClear: (way: string, line: string) => `Lay ${way} so that it does not cross ${line}`,
  pickWinds: (stand: string, bed: string) => `Hunt ${stand} only on winds that keep the walk off ${bed}`,
  leadRound: (line: string, way: string) => `Lead ${line} round ${way} with brush or a fence gap`,
  theLine: 'the line',
} as const;
