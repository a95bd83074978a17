import { makeHostedElevation } from './hosted';
import { type ElevationPort, elevationFailure } from './port';
import { ELEVATION_FAULTS, ELEVATION_LABELS } from './words';

export interface ElevationSettings {
  /** fake or hosted. */
  elevation: string;
  elevationUrl?: string | undefined;
  weatherApiKey?: string | undefined;
}

/** The heights a setting names. */
export function chooseElevation(settings: ElevationSettings): ElevationPort {
  if (settings.elevation !== 'hosted') return fake();
  const customer = settings.weatherApiKey ? 'customer-' : '';
  return makeHostedElevation({
    url: settings.elevationUrl ?? `https://${customer}api.open-meteo.com/v1/elevation`,
    apiKey: settings.weatherApiKey,
    source: 'hosted',
    label: ELEVATION_LABELS.hosted,
  });
}

/** The hosted adapter pointed at made hills on this machine, whose server starts with the first request. */
function fake(): ElevationPort {
  return {
    source: 'fake',
    label: ELEVATION_LABELS.made,
    heights: async (places, signal) => {
      let url: string;
      try {
        const { serveFakeElevation } = await import('./fake/serve');
        url = await serveFakeElevation();
      } catch {
        return elevationFailure('unavailable', ELEVATION_FAULTS.madeNotStarted);
      }
      return makeHostedElevation({ url, source: 'fake', label: ELEVATION_LABELS.made }).heights(places, signal);
    },
  };
}
