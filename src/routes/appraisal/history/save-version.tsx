import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { Field, INPUT } from '../../../components/form/field.tsx';
import { putSetting, useSetting } from '../../../store/device-settings.ts';
import { type StoreCode, storeCode } from '../../../store/store-error.ts';
import { useSession } from '../session-context.ts';

interface Said {
  readonly author: string;
  readonly message: string;
}

const LONGEST_NAME = 100;
const LONGEST_MESSAGE = 500;

/** Keeps the work as it stands, with who did it and why. */
export function SaveVersion() {
  const { t } = useTranslation();
  const author = useSetting('author');
  if (author === undefined) return null;
  return (
    <section aria-label={t('history.save')} className="border-t border-ink py-5">
      <SaveForm author={author ?? ''} />
    </section>
  );
}

function SaveForm({ author }: { author: string }) {
  const { t } = useTranslation();
  const { session, state, readOnly } = useSession();
  const [outcome, setOutcome] = useState<StoreCode | 'saved' | null>(null);
  const form = useForm<Said>({ defaultValues: { author, message: '' } });
  const { errors, isSubmitting } = form.formState;
  const canSave = state.changed || state.appraisal === null;
  const save = async (said: Said) => {
    setOutcome(null);
    try {
      await putSetting('author', said.author.trim());
      await session.saveVersion(said.message.trim());
      form.reset({ author: said.author, message: '' });
      setOutcome('saved');
    } catch (problem) {
      setOutcome(storeCode(problem));
    }
  };
  const tooLong = (limit: number) => ({ value: limit, message: t('form.max', { limit }) });
  return (
    <form
      data-own-undo
      className="grid max-w-[46em] gap-4"
      onSubmit={(event) => void form.handleSubmit(save)(event)}
    >
      <p className="text-sm text-mute">{t(canSave ? 'history.changed' : 'history.unchanged')}</p>
      <Field
        label={t('history.message')}
        help={t('history.messageHelp')}
        error={errors.message?.message}
      >
        {(parts) => (
          <input
            {...parts}
            className={INPUT}
            autoComplete="off"
            {...form.register('message', { maxLength: tooLong(LONGEST_MESSAGE) })}
          />
        )}
      </Field>
      <Field
        label={t('history.author')}
        help={t('history.authorHelp')}
        error={errors.author?.message}
        className="max-w-80"
      >
        {(parts) => (
          <input
            {...parts}
            className={INPUT}
            autoComplete="name"
            {...form.register('author', { maxLength: tooLong(LONGEST_NAME) })}
          />
        )}
      </Field>
      <div className="flex flex-wrap items-center gap-x-4 gap-y-2">
        <button
          type="submit"
          className="control-primary disabled:opacity-60"
          disabled={!canSave || isSubmitting || readOnly}
        >
          {t('history.save')}
        </button>
        <p role="status">
          {outcome === 'saved' && t('history.saved')}
          {outcome && outcome !== 'saved' && <span className="text-clay">{t(outcome)}</span>}
        </p>
      </div>
    </form>
  );
}
