import { useTranslation } from 'react-i18next';
import { useEditing } from '../editing/context.tsx';
import { LabelAt, TextAt } from './fields.tsx';
import { Section } from './section.tsx';

/** What is to be decided, for whom, and from whose point of view. */
export function Decision() {
  const { t } = useTranslation();
  const { question } = useEditing().document;
  return (
    <Section title={t('framing.decisionTitle')}>
      <LabelAt at={['question', 'title']} value={question.title} label={t('framing.title')} />
      <TextAt
        at={['question', 'decision']}
        value={question.decision}
        optional
        lines={2}
        label={t('framing.decision')}
        help={t('framing.decisionHelp')}
      />
      <TextAt
        at={['question', 'population']}
        value={question.population}
        lines={2}
        label={t('question.population')}
      />
      <TextAt
        at={['question', 'perspective']}
        value={question.perspective}
        lines={1}
        label={t('question.perspective')}
        help={t('framing.perspectiveHelp')}
      />
      <TextAt
        at={['question', 'setting']}
        value={question.setting}
        lines={1}
        label={t('question.setting')}
      />
    </Section>
  );
}
