import { useTranslation } from 'react-i18next';
import { usePageTitle } from '../../../components/page-title.ts';
import { EditingProvider } from '../editing/context.tsx';
import { useSession } from '../session-context.ts';
import { Groups } from './groups.tsx';
import { Register } from './register.tsx';

/** The evidence register: every parameter, how sure it is, and where it comes from. */
export function Component() {
  const { t } = useTranslation();
  const { document, issues, edit } = useSession();
  usePageTitle(t('steps.evidence'), document.question.title);
  return (
    <EditingProvider document={document} issues={issues} edit={edit}>
      <Register />
      <Groups />
    </EditingProvider>
  );
}
