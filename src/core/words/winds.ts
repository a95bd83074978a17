/** What is wrong with a wind that somebody typed. */
export const WIND_ERRORS = {
  overCircle: (degrees: string) => `${degrees} is more than 360 degrees.`,
  notPoint: (text: string) => `"${text}" is not a compass point (N, NNE, NE ... NNW) or a number of degrees.`,
  notWind: (text: string) => `"${text}" is not a wind: type a point (W), a span (NW-N) or degrees (310-20).`,
  oneDirection: (degrees: string) => `${degrees} is one direction only: type a span such as 300-320.`,
  notMetar: (text: string) => `Not a METAR wind: "${text}".`,
  notSpan: (text: string) => `Not a span of directions: "${text}".`,
} as const;
