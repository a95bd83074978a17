import { makeHostedElevation } from './hosted';
import { type ElevationPort, elevationFailure } from './port';

export interface ElevationSettings {
  /** fake or hosted. */
  elevation: string;
  elevationUrl?: string | undefined;
  weatherApiKey?: string | undefined;
}

const FAKE_LABEL = 'made-up hills (no elevation service is set up)';

/** The heights a setting names. */
export function chooseElevation(settings: ElevationSettings): ElevationPort {
  if (settings.elevation !== 'hosted') return fake();
  const customer = settings.weatherApiKey ? 'customer-' : '';
  return makeHostedElevation({
    url: settings.elevationUrl ?? `https://${customer}api.open-meteo.com/v1/elevation`,
    apiKey: settings.weatherApiKey,
    source: 'hosted',
    label: 'Open-Meteo, Copernicus heights 90 m apart',
  });
}

/** The hosted adapter pointed at made hills on this machine, whose server starts with the first request. */
function fake(): ElevationPort {
  return {
    source: 'fake',
    label: FAKE_LABEL,
    heights: async (places, signal) => {
      let url: string;
      try {
        const { serveFakeElevation } = await import('./fake/serve');
        url = await serveFakeElevation();
      } catch {
        return elevationFailure('unavailable', 'The made hills could not be started on this machine.');
      }
      return makeHostedElevation({ url, source: 'fake', label: FAKE_LABEL }).heights(places, signal);
    },
  };
}
