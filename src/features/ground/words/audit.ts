export const GROUND_AUDIT = {
  opened: (what: string, from: string) => `Opened ${what} again from ${from}.`,
  approachAdded: (approach: string, stand: string) => `Added approach ${approach} to ${stand}.`,
  featureAdded: (name: string) => `Added feature ${name}.`,
  parkingAdded: (name: string) => `Added parking place ${name}.`,
  standAdded: (name: string) => `Added stand ${name}.`,
  approachChanged: (approach: string, stand: string) => `Changed approach ${approach} to ${stand}.`,
  featureChanged: (name: string) => `Changed feature ${name}.`,
  parkingChanged: (name: string) => `Changed parking place ${name}.`,
  standChanged: (name: string) => `Changed stand ${name}.`,
  approachRemoved: (approach: string) => `Removed approach ${approach}.`,
  featureRemoved: (feature: string) => `Removed feature ${feature}.`,
  parkingRemoved: (parking: string) => `Removed parking place ${parking}.`,
  standRemoved: (stand: string) => `Removed stand ${stand} with its approaches and closures.`,
  /** `to` null: until opened again. */
  closed: (what: string, from: string, to: string | null, reason: string) =>
    `Closed ${what} from ${from} ${to === null ? 'until opened again' : `to ${to}`}: ${reason}`,
} as const;
