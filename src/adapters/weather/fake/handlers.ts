import { HttpResponse, http } from 'msw';
import { type EncodedSeries, encodeAnswer } from './encode';
import { latestRun, MEMBER_COUNT, makeForecast } from './make-forecast';
import { encodeVariable, SERVED } from './variables';

const HOUR_S = 3600;
const DAY_S = 24 * HOUR_S;

/** What goes wrong with an answer, for tests. */
export type WeatherTrouble =
  | 'not_found'
  | 'busy'
  | 'limit'
  | 'broken'
  | 'cut'
  | 'wrong_place'
  | 'no_wind'
  | 'some_wind';

export interface FakeWeatherOptions {
  now: () => number;
  forecast?: WeatherTrouble;
  ensemble?: WeatherTrouble;
  archive?: WeatherTrouble;
  /** Told of each request before it is answered. */
  onRequest?: (kind: 'forecast' | 'ensemble' | 'archive', url: URL) => void;
}

/** Answers to the weather SDK's own requests, in its own binary form, from made weather. */
export function makeWeatherHandlers(options: FakeWeatherOptions) {
  const answer = (kind: 'forecast' | 'ensemble' | 'archive') => (info: { request: Request }) => {
    const url = new URL(info.request.url);
    options.onRequest?.(kind, url);
    return respond(kind, url.searchParams, options.now(), options[kind]);
  };
  return (['forecast', 'ensemble', 'archive'] as const).map((kind) => http.get(`*/v1/${kind}`, answer(kind)));
}

function respond(
  kind: 'forecast' | 'ensemble' | 'archive',
  query: URLSearchParams,
  now: number,
  trouble?: WeatherTrouble,
): Response {
  if (trouble === 'not_found') return refuse(404, 'Not Found');
  if (trouble === 'busy') return new HttpResponse('<html><body>Service unavailable</body></html>', { status: 503 });
  if (trouble === 'limit') return refuse(429, 'Hourly API request limit exceeded. Please try again in the next hour.');
  if (trouble === 'broken') return new HttpResponse('', { status: 500, statusText: 'Internal Server Error' });

  const place = { lat: Number(query.get('latitude') ?? 'none'), lon: Number(query.get('longitude') ?? 'none') };
  if (!(Math.abs(place.lat) <= 90 && Math.abs(place.lon) <= 180)) {
    return refuse(400, 'Latitude must be in range of -90 to 90 and longitude in range of -180 to 180.');
  }
  const names = (query.get('hourly') ?? '').split(',').filter((name) => name !== '');
  const unknown = names.find((name) => !Object.hasOwn(SERVED, name));
  if (unknown) return refuse(400, `Data corrupted at path ''. Cannot initialize hourly variable from ${unknown}.`);

  const hourly = makeHourly(place, names, query, now, kind === 'ensemble' ? MEMBER_COUNT : 0);
  if (trouble === 'no_wind' || trouble === 'some_wind') {
    for (const variable of hourly.variables) {
      variable.values = variable.values.map((value, index) =>
        trouble === 'some_wind' && index % 5 > 0 ? value : Number.NaN,
      );
    }
  }
  const run = latestRun(now) / 1000;
  const body = encodeAnswer({
    // A model answers for the middle of its grid cell, not for the place itself.
    lat: trouble === 'wrong_place' ? place.lat - 7 : Math.round(place.lat * 8) / 8,
    lon: Math.round(place.lon * 8) / 8,
    current: query.get('current') ? { start: run, end: run + 900, intervalS: 900, variables: [] } : null,
    hourly,
  });
  return HttpResponse.arrayBuffer(trouble === 'cut' ? body.slice(0, body.length / 3).buffer : body.buffer);
}

function makeHourly(
  place: { lat: number; lon: number },
  names: string[],
  query: URLSearchParams,
  now: number,
  members: number,
): EncodedSeries {
  const days = (name: string, most: number, fallback: number) =>
    Math.min(most, Math.max(0, Math.trunc(Number(query.get(name) ?? fallback)) || 0));
  const today = Math.floor(now / 1000 / DAY_S) * DAY_S;
  const dated = datesOf(query);
  const start = dated?.start ?? today - days('past_days', 92, 0) * DAY_S;
  const end = dated?.end ?? today + days('forecast_days', 16, 7) * DAY_S;
  const instants = Array.from({ length: (end - start) / HOUR_S }, (_, index) => (start + index * HOUR_S) * 1000);
  const speedUnit = query.get('wind_speed_unit') ?? 'kmh';
  // What is past was not forecast: it is made as it then was.
  const runOf = (at: number) => (dated ? at : latestRun(now));
  const byMember = Array.from({ length: members + 1 }, (_, member) =>
    instants.map((at) => makeForecast(place, runOf(at), at, member)),
  );
  const variables = names.flatMap((name) => {
    const served = SERVED[name];
    return served ? byMember.map((made, member) => encodeVariable(served, made, member, speedUnit)) : [];
  });
  return { start, end, intervalS: HOUR_S, variables };
}

/** Days asked for by their dates, as the archive is. */
function datesOf(query: URLSearchParams): { start: number; end: number } | null {
  const at = (name: string) => Date.parse(`${query.get(name) ?? ''}T00:00:00Z`) / 1000;
  const [start, end] = [at('start_date'), at('end_date') + DAY_S];
  return end > start && end - start <= 400 * DAY_S ? { start, end } : null;
}

function refuse(status: number, reason: string): Response {
  return HttpResponse.json({ error: true, reason }, { status });
}
