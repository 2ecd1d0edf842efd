import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';
import { digestOf } from '../../../../shared/model/digest.ts';
import type { ModelDocument } from '../../../../shared/model/document.ts';
import { hasErrors } from '../../../../shared/model/issue.ts';
import { thresholdInForce } from '../../../../shared/model/threshold.ts';
import { formatMoney, formatProbability } from '../../../i18n/format.ts';
import { outcomeWords } from '../../../i18n/outcome-words.ts';
import { answerAt } from '../../../store/answer.ts';
import { useSettings } from '../../../store/settings.ts';
import { answerOfVersion } from '../../../store/version-answer.ts';

interface AnswersProps {
  readonly before: ModelDocument;
  readonly after: ModelDocument;
}

/** The answer of each, at its own threshold in force. */
export function Answers({ before, after }: AnswersProps) {
  const { t } = useTranslation();
  return (
    <div className="mt-5 grid gap-x-8 gap-y-3 sm:grid-cols-2">
      <Answer title={t('history.answerBefore')} document={before} />
      <Answer title={t('history.answerAfter')} document={after} />
    </div>
  );
}

function useAnswer(document: ModelDocument) {
  const documentDigest = useMemo(() => digestOf(document), [document]);
  return useQuery({
    queryKey: ['version-answer', documentDigest],
    queryFn: () => answerOfVersion({ document, documentDigest }),
    structuralSharing: false,
  });
}

function Answer({ title, document }: { title: string; document: ModelDocument }) {
  const { t } = useTranslation();
  const { language } = useSettings();
  const { data } = useAnswer(document);
  const { question, strategies } = document;
  const threshold = thresholdInForce(question);
  const names = new Map(strategies.map(({ id, label }) => [id, label]));
  const comparison = data && !hasErrors(data.issues) ? data.comparison : null;
  const answer = comparison && answerAt(document, comparison, data?.draws ?? null, threshold);
  const { symbol } = question.currency;
  const at = t('threshold', {
    amount: formatMoney(threshold, symbol, language),
    unit: outcomeWords(question, t).per,
  });
  return (
    <div className="min-w-0 border-l-2 border-rule pl-4">
      <h3 className="text-sm font-normal text-mute">{title}</h3>
      {!data && <p className="text-mute">{t('strip.working')}</p>}
      {data && !answer && <p className="text-clay">{t('strip.broken')}</p>}
      {answer && (
        <>
          <p className="text-lg font-bold">{names.get(answer.best)}</p>
          <p className="text-sm text-mute">{t('strip.bestAt', { threshold: at })}</p>
          <p className="text-sm">
            {t('history.netBenefit', {
              amount: formatMoney(answer.netBenefit, symbol, language, { signed: true }),
              comparator: names.get(question.comparator),
            })}
          </p>
          {answer.chances && (
            <p className="text-sm">
              {t('history.probability', {
                share: formatProbability(answer.chances.probabilityBest.value, language),
              })}
            </p>
          )}
        </>
      )}
    </div>
  );
}
