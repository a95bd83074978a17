export const MAP_AUDIT = {
  added: (what: string) => `Added ${what} on the map.`,
  changed: (what: string) => `Changed ${what} on the map.`,
  /** What the two above speak of. */
  stand: (name: string) => `stand ${name}`,
  parking: (name: string) => `parking place ${name}`,
  feature: (name: string) => `feature ${name}`,
  approach: (name: string, stand: string) => `approach ${name} to ${stand}`,
  approachRemoved: (name: string, stand: string | undefined) =>
    `Removed approach ${name}${stand ? ` to ${stand}` : ''}.`,
  featureRemoved: (name: string) => `Removed feature ${name}.`,
  itemRemoved: (layer: string, name: string) => `Removed ${layer.toLowerCase()}${name ? ` ${name}` : ''} from the map.`,
} as const;
