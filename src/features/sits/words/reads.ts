/** What the reads of the list say in words. */

export const ASK_ERRORS = {
  day: 'Write a day as YYYY-MM-DD.',
  years: 'Choose a day of this century.',
  window: 'Choose morning or evening.',
  weapon: 'Choose one of the weapons.',
  noHours: 'There are no hours of weather to look back on yet.',
} as const;

export const MOON_WORDS = { lit: (name: string, percent: number) => `${name}, ${percent} % lit` } as const;

export const WEATHER_WORDS = {
  noWind: 'Wind not given',
  calm: (gusts: string) => `Calm${gusts}`,
  gusts: (speed: string) => `, gusts ${speed}`,
  variable: 'Variable',
  wind: (from: string, speed: string, gusts: string) => `${from} ${speed}${gusts}`,
  to: ' to ',
  rain: (amount: string) => `rain ${amount}`,
  dry: 'dry',
  thunder: 'thunder',
  steady: 'steady',
  rising: 'rising',
  falling: 'falling',
  barometer: (pressure: string, trend: string) => `${pressure}, ${trend}`,
} as const;

/** The list as a table of plain text, for a terminal. */
export const PRINT_WORDS = {
  stand: 'Stand',
  word: 'Word',
  score: 'Score',
  quiet: 'Quiet',
  promise: 'Promise',
  sure: 'Sure',
  line: 'In a line',
  span: (from: string, to: string) => `${from} to ${to}`,
  noForecast: 'No forecast for this window',
  forecast: (weather: string, source: string | null, error: string | null) =>
    `${weather}. Forecast: ${source ?? 'none'}${error ? ` (${error})` : ''}`,
} as const;
