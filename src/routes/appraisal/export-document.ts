import type { ModelDocument } from '../../../shared/model/document.ts';
import { saveFile } from '../../components/save-file.ts';
import { exportName, exportText } from '../../store/document-file.ts';

/** The document as a JSON file to the reader's device. */
export async function exportDocument(document: ModelDocument): Promise<void> {
  saveFile(exportName(document), await exportText(document), 'application/json');
}
