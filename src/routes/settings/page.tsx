import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { NumberField } from '../../components/form/number-field.tsx';
import { SelectField } from '../../components/form/select-field.tsx';
import { TextField } from '../../components/form/text-field.tsx';
import { KeysList } from '../../components/keys-list.tsx';
import { usePageTitle } from '../../components/page-title.ts';
import { Preferences } from '../../components/preferences.tsx';
import { formatNumber } from '../../i18n/format.ts';
import { putSetting, useSetting } from '../../store/device-settings.ts';
import { changeSettings, FIRST_SAMPLES, useSettings } from '../../store/settings.ts';
import { MOST_WORKERS, poolSize } from '../../workers/spawn.ts';
import { PlainPage } from '../plain-page.tsx';
import { Storage } from './storage.tsx';

/** What holds for every appraisal on this device. */
export function Component() {
  const { t } = useTranslation();
  usePageTitle(t('shell.settings'));
  return (
    <PlainPage hasChoices help="settings">
      <h1 className="mt-8 mb-6 text-3xl">{t('shell.settings')}</h1>
      <Part title={t('settings.look')}>
        <Preferences stacked />
      </Part>
      <Part title={t('settings.person')}>
        <Author />
      </Part>
      <Part title={t('settings.work')}>
        <Work />
      </Part>
      <Part title={t('settings.storage')}>
        <Storage />
      </Part>
      <Part title={t('keys.title')}>
        <KeysList />
      </Part>
    </PlainPage>
  );
}

function Part({ title, children }: { title: string; children: ReactNode }) {
  return (
    <section className="border-t border-ink py-5 lg:grid lg:grid-cols-[13rem_1fr] lg:gap-x-8">
      <h2 className="mb-3 text-lg">{title}</h2>
      <div className="grid max-w-[40em] gap-4">{children}</div>
    </section>
  );
}

function Author() {
  const { t } = useTranslation();
  const author = useSetting('author');
  if (author === undefined) return null;
  return (
    <div data-own-undo>
      <TextField
        label={t('history.author')}
        help={t('history.authorHelp')}
        value={author ?? ''}
        maxLength={100}
        onValue={(name) => {
          // Where nothing can be kept, the storage part of the page says so.
          void putSetting('author', name).catch(() => {});
        }}
        className="max-w-80"
      />
    </div>
  );
}

function Work() {
  const { t } = useTranslation();
  const { language, samples, workers } = useSettings();
  const counts = Array.from({ length: MOST_WORKERS }, (_, index) => index + 1);
  return (
    <>
      <NumberField
        label={t('settings.samples')}
        help={t('settings.samplesHelp', { number: formatNumber(FIRST_SAMPLES, language) })}
        value={samples}
        whole
        min={0}
        max={1_000_000}
        onValue={(value) => changeSettings({ samples: value })}
      />
      <SelectField
        label={t('settings.workers')}
        help={t('settings.workersHelp')}
        value={workers === null ? 'auto' : String(workers)}
        options={[
          { value: 'auto', name: t('settings.workersAuto', { count: poolSize(null) }) },
          ...counts.map((count) => ({ value: String(count), name: String(count) })),
        ]}
        onValue={(value) => changeSettings({ workers: value === 'auto' ? null : Number(value) })}
        className="max-w-80"
      />
    </>
  );
}
