import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { useNavigate } from 'react-router-dom';
import { TEMPLATE_SLUGS, type TemplateSlug } from '../../../shared/model/templates/templates.ts';
import { beginFromTemplate } from '../../store/begin.ts';
import { OpenFile } from './open-file.tsx';

/** Starting points of an appraisal of one's own: nothing, a template, a file. */
export function Begin() {
  const { t } = useTranslation();
  const navigate = useNavigate();
  const [busy, setBusy] = useState(false);
  const begin = async (slug: TemplateSlug) => {
    setBusy(true);
    try {
      await navigate(`/appraisals/${await beginFromTemplate(slug)}/question`);
    } finally {
      setBusy(false);
    }
  };
  return (
    <section aria-labelledby="begin-title" className="mt-10">
      <h2 id="begin-title" className="border-b border-ink pb-1.5 text-lg">
        {t('begin.title')}
      </h2>
      <p className="mt-3 max-w-[44em] text-mute">{t('begin.lead')}</p>
      <ul className="mt-2 grid gap-x-8 sm:grid-cols-2">
        {TEMPLATE_SLUGS.map((slug) => (
          <li key={slug} className="border-b border-rule">
            <button
              type="button"
              disabled={busy}
              onClick={() => void begin(slug)}
              className="block min-h-11 w-full py-3 text-left hover:bg-raised"
            >
              <span className="block font-bold underline decoration-rule-strong underline-offset-4">
                {t(`begin.templates.${slug}.name`)}
              </span>
              <span className="block text-mute">{t(`begin.templates.${slug}.body`)}</span>
            </button>
          </li>
        ))}
      </ul>
      <OpenFile />
    </section>
  );
}
