import type { SitsBrief, SitsView } from './view-types';

/** The list without what only its drawing needs: the winds by 5 degrees are most of its weight. */
export function briefView(view: SitsView): SitsBrief {
  return {
    club: view.club,
    window: view.window,
    weapon: view.weapon,
    sky: { rise: view.sky.rise, set: view.sky.set },
    cautions: view.cautions,
    mine: view.mine,
    open: view.open.map(({ standId, name, sentence, weapons, way, waysIn, cautions }) => ({
      standId,
      name,
      sentence,
      weapons,
      way,
      waysIn,
      cautions,
    })),
    blocked: view.blocked.map(({ standId, name, gates }) => ({ standId, name, gate: gates[0]?.text ?? null })),
  };
}
