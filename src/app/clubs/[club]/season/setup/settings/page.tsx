import { SettingsForm } from '@/features/setup/components/settings-form';
import { getSetupSettings } from '@/features/setup/settings-data';
import { settingsToForm } from '@/features/setup/settings-schema';
import { SETTING_WORDS as W } from '@/features/setup/words/settings';
import { clubPage } from '@/server/doors';
import { PageTitle } from '@/ui/page-parts';
import { saveSetupSettingsAction } from './actions';

export const metadata = { title: W.title };

export default clubPage('features.write', async ({ scope }) => {
  const { slug, name, units } = scope.club;
  const { own, version } = await getSetupSettings(scope);
  return (
    <>
      <PageTitle over={name} title={W.title} lead={W.lead} />
      <SettingsForm
        key={version}
        club={slug}
        units={units}
        values={settingsToForm(own, units, version)}
        action={saveSetupSettingsAction}
      />
    </>
  );
});
