import type { WeatherPlace } from '@/adapters/weather/port';

/** To 0.01 degree (about a kilometre), finer than any forecast: clubs side by side share one request. */
export function roundPlace(place: WeatherPlace): WeatherPlace {
  const round = (deg: number) => Math.round(deg * 100) / 100 + 0;
  return { lat: round(place.lat), lon: round(place.lon) };
}

/** The source is part of the key, so that made weather is never shown for real after the setting changes. */
export function placeKey(source: string, place: WeatherPlace): string {
  const { lat, lon } = roundPlace(place);
  return `${source}@${lat.toFixed(2)},${lon.toFixed(2)}`;
}
