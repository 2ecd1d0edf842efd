import { useTranslation } from 'react-i18next';
import { renameSymbol } from '../../../../shared/formula/edit/rename-symbol.ts';
import { type Named, symbolIssue } from '../../../../shared/formula/edit/symbols.ts';
import { TextField } from '../../../components/form/text-field.tsx';
import { issueWords } from '../../../i18n/issue-words.ts';
import { useEditing } from './context.tsx';

/** What formulas call a thing; another name is put into all of them. */
export function SymbolField({ named, symbol }: { named: Named; symbol: string }) {
  const { t } = useTranslation();
  const { document, language, edit } = useEditing();
  return (
    <TextField
      label={t('editing.symbol')}
      help={t('editing.symbolHelp')}
      value={symbol}
      required
      check={(text) => {
        const issue = symbolIssue(document, text, named);
        return issue && issueWords(issue, { t, language, document });
      }}
      onValue={(text) => {
        const edits = renameSymbol(document, named, text);
        const group = `symbol ${named.what} ${named.id}`;
        edit(edits, t('editing.acts.renamed', { from: symbol, to: text }), group);
      }}
    />
  );
}
