import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { addCovariate } from '../../../../shared/formula/edit/add-covariate.ts';
import type { Profile as ProfileOf } from '../../../../shared/model/document.ts';
import { addProfile, shareEdits } from '../../../../shared/model/edit/add-profile.ts';
import { formatPercent } from '../../../i18n/format.ts';
import { useEditing } from '../editing/context.tsx';
import { IssueLines } from '../editing/issue-lines.tsx';
import { ItemActions } from '../editing/item-actions.tsx';
import { SymbolField } from '../editing/symbol-field.tsx';
import { LabelAt, NumberAt, TextAt } from './fields.tsx';
import { Section } from './section.tsx';

/** Subgroups that the model runs for, each with its share and its covariates. */
export function Profiles() {
  const { t } = useTranslation();
  const { document, edit, issuesAt } = useEditing();
  const [added, setAdded] = useState<string | null>(null);
  const add = () => {
    const label = t('framing.newProfile', { number: document.profiles.length + 1 });
    const { edits, id } = addProfile(document, { label });
    edit(edits, t('framing.added', { what: label }));
    setAdded(id);
  };
  return (
    <Section title={t('framing.profiles')}>
      <p className="text-sm text-mute">{t('framing.profilesHelp')}</p>
      <ul>
        {document.profiles.map((profile) => (
          <Profile key={profile.id} profile={profile} isNew={profile.id === added} />
        ))}
      </ul>
      <Shares />
      <IssueLines issues={issuesAt(['profiles'])} />
      <p>
        <button type="button" className="control" onClick={add}>
          {t('framing.addProfile')}
        </button>
      </p>
    </Section>
  );
}

function Profile({ profile, isNew }: { profile: ProfileOf; isNew: boolean }) {
  const { t } = useTranslation();
  const { covariates } = useEditing().document;
  const { id, label, share } = profile;
  const at = ['profiles', { id }];
  return (
    <li className="flex flex-wrap items-end gap-x-4 gap-y-2 border-t border-rule py-3 first:border-t-0 first:pt-0">
      <LabelAt
        at={[...at, 'label']}
        value={label}
        label={t('framing.profileName')}
        autoFocus={isNew}
        className="flex-1 basis-52"
      />
      <NumberAt
        at={[...at, 'share']}
        value={share}
        percent
        min={0}
        max={1}
        unit="%"
        label={t('framing.share')}
        className="w-32"
      />
      {covariates.map((covariate) => (
        <NumberAt
          key={covariate.id}
          at={[...at, 'covariates', covariate.id]}
          value={profile.covariates[covariate.id] ?? 0}
          label={covariate.label}
          className="w-32"
          {...(covariate.unit ? { unit: covariate.unit } : {})}
        />
      ))}
      <ItemActions target={{ what: 'profile', id }} label={label} />
    </li>
  );
}

const TOLERANCE = 1e-9;

/** What the shares add up to, and a way to make it the whole. */
function Shares() {
  const { t } = useTranslation();
  const { document, edit, language } = useEditing();
  const { profiles } = document;
  const sum = profiles.reduce((total, { share }) => total + share, 0);
  if (Math.abs(sum - 1) <= TOLERANCE) return null;
  const scale = () =>
    edit(
      shareEdits(profiles, ({ share }) => (sum > 0 ? share / sum : 1 / profiles.length)),
      t('framing.scale'),
    );
  return (
    <p className="flex flex-wrap items-center gap-x-4 text-clay">
      {t('framing.sharesSum', { sum: formatPercent(sum, language) })}
      <button type="button" className="control" onClick={scale}>
        {t('framing.scale')}
      </button>
    </p>
  );
}

/** What profiles differ by, as formulas name it: age at the start, sex. */
export function Covariates() {
  const { t } = useTranslation();
  const { document, edit } = useEditing();
  const add = () => {
    const label = t('framing.newCovariate', { number: document.covariates.length + 1 });
    edit(addCovariate(document, { label }).edits, t('framing.added', { what: label }));
  };
  return (
    <Section title={t('framing.covariates')}>
      <p className="text-sm text-mute">{t('framing.covariatesHelp')}</p>
      {document.covariates.length > 0 && (
        <ul>
          {document.covariates.map(({ id, label, symbol, unit }) => (
            <li
              key={id}
              className="grid items-start gap-3 border-t border-rule py-3 first:border-t-0 first:pt-0 sm:grid-cols-[1fr_1fr_8rem]"
            >
              <LabelAt
                at={['covariates', { id }, 'label']}
                value={label}
                label={t('framing.covariateName')}
              />
              <SymbolField named={{ what: 'covariate', id }} symbol={symbol} />
              <TextAt
                at={['covariates', { id }, 'unit']}
                value={unit}
                optional
                maxLength={60}
                label={t('framing.covariateUnit')}
              />
              <ItemActions target={{ what: 'covariate', id }} label={label} />
            </li>
          ))}
        </ul>
      )}
      <p>
        <button type="button" className="control" onClick={add}>
          {t('framing.addCovariate')}
        </button>
      </p>
    </Section>
  );
}
