import { useTranslation } from 'react-i18next';
import type { Json, Place } from '../../../../shared/model/edit/edit.ts';
import { useEditing } from '../editing/context.tsx';
import { LabelAt, NumberAt, SelectAt, TextAt } from './fields.tsx';
import { Pair, Section } from './section.tsx';

/** The reference case that the appraisal follows, where there is one. */
export function ReferenceCase() {
  const { t } = useTranslation();
  const { referenceCase } = useEditing().document.question;
  const at = ['question', 'referenceCase'];
  const title = t('question.referenceCase');
  return (
    <Section title={title}>
      {referenceCase && (
        <>
          <LabelAt
            at={[...at, 'label']}
            value={referenceCase.label}
            label={t('framing.referenceName')}
          />
          <TextAt
            at={[...at, 'source']}
            value={referenceCase.source}
            optional
            lines={1}
            label={t('framing.source')}
          />
        </>
      )}
      <Optional
        at={at}
        isThere={referenceCase !== undefined}
        what={title}
        add={t('framing.addReference')}
        remove={t('framing.removeReference')}
        first={{ label: t('framing.referenceFirst') }}
      />
    </Section>
  );
}

/** Who the decision is for, to say what knowing more is worth to all of them. */
export function Beneficiaries() {
  const { t } = useTranslation();
  const { beneficiaries, discounting } = useEditing().document.question;
  const at = ['question', 'beneficiaries'];
  const title = t('question.beneficiaries');
  const rate = typeof discounting.costs === 'number' ? discounting.costs : 0;
  const first = { label: t('framing.beneficiariesFirst'), incidence: 0, prevalent: 0, years: 1 };
  return (
    <Section title={title}>
      {beneficiaries ? (
        <>
          <LabelAt
            at={[...at, 'label']}
            value={beneficiaries.label}
            label={t('framing.beneficiariesName')}
          />
          <Pair>
            <NumberAt
              at={[...at, 'incidence']}
              value={beneficiaries.incidence}
              min={0}
              label={t('framing.incidence')}
            />
            <NumberAt
              at={[...at, 'prevalent']}
              value={beneficiaries.prevalent}
              min={0}
              label={t('framing.prevalent')}
            />
            <NumberAt
              at={[...at, 'years']}
              value={beneficiaries.years}
              above={0}
              unit={t('framing.years')}
              label={t('framing.decisionYears')}
            />
            <NumberAt
              at={[...at, 'discountRate']}
              value={beneficiaries.discountRate}
              percent
              above={-1}
              max={1}
              unit="%"
              label={t('framing.beneficiariesRate')}
            />
          </Pair>
        </>
      ) : (
        <p className="text-sm text-mute">{t('framing.beneficiariesHelp')}</p>
      )}
      <Optional
        at={at}
        isThere={beneficiaries !== undefined}
        what={title}
        add={t('framing.addBeneficiaries')}
        remove={t('framing.removeBeneficiaries')}
        first={{ ...first, discountRate: rate }}
      />
    </Section>
  );
}

const PLANS = ['plain', 'lhs', 'sobol'] as const;

/** How the uncertainty of parameters is drawn. */
export function Draws() {
  const { t } = useTranslation();
  const { samples, seed, plan } = useEditing().document.analysis;
  return (
    <Section title={t('framing.drawsTitle')}>
      <Pair>
        <NumberAt
          at={['analysis', 'samples']}
          value={samples}
          whole
          min={0}
          max={1_000_000}
          label={t('framing.samples')}
          help={t('framing.samplesHelp')}
        />
        <NumberAt
          at={['analysis', 'seed']}
          value={seed}
          whole
          min={0}
          max={4_294_967_295}
          label={t('framing.seed')}
          help={t('framing.seedHelp')}
        />
        <SelectAt
          at={['analysis', 'plan']}
          value={plan}
          options={PLANS.map((value) => ({ value, name: t(`framing.plans.${value}`) }))}
          label={t('framing.plan')}
        />
      </Pair>
    </Section>
  );
}

/** What a reader of the appraisal has to know about it. */
export function About() {
  const { t } = useTranslation();
  const { about } = useEditing().document;
  return (
    <Section title={t('framing.about')}>
      <TextAt
        at={['about', 'summary']}
        value={about.summary}
        optional
        lines={3}
        label={t('framing.summary')}
      />
      <TextAt
        at={['about', 'limits']}
        value={about.limits}
        optional
        lines={3}
        label={t('question.limits')}
      />
      <TextAt
        at={['about', 'citation']}
        value={about.citation}
        optional
        lines={1}
        label={t('framing.citation')}
      />
    </Section>
  );
}

interface OptionalProps {
  readonly at: Place;
  readonly isThere: boolean;
  readonly what: string;
  readonly add: string;
  readonly remove: string;
  /** What it begins as. */
  readonly first: Json;
}

function Optional({ at, isThere, what, add, remove, first }: OptionalProps) {
  const { change } = useEditing();
  return (
    <p>
      <button
        type="button"
        className="control"
        onClick={() => change(at, isThere ? undefined : first, what)}
      >
        {isThere ? remove : add}
      </button>
    </p>
  );
}
