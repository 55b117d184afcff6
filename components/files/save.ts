import { type FileTable, fileStem } from './file-table';

const give = (blob: Blob, name: string): void => {
  const address = URL.createObjectURL(blob);
  const link = document.createElement('a');
  link.href = address;
  link.download = name;
  link.click();
  // The browser has taken hold of the file once the click is over.
  window.setTimeout(() => URL.revokeObjectURL(address), 0);
};

const originNow = () => ({ madeAt: new Date(), address: window.location.href });

/** Hands the table to the reader as a CSV file. What writes it is loaded when it is first asked for. */
export const saveCsv = async (table: FileTable): Promise<void> => {
  const { toCsv } = await import('./csv');
  give(new Blob([toCsv(table)], { type: 'text/csv;charset=utf-8' }), `${fileStem(table, originNow())}.csv`);
};

/** Hands the table to the reader as an Excel workbook. */
export const saveXlsx = async (table: FileTable): Promise<void> => {
  const origin = originNow();
  const [{ toWorkbook }, { default: writeXlsxFile }] = await Promise.all([
    import('./xlsx'),
    import('write-excel-file/browser'),
  ]);
  give(await writeXlsxFile(toWorkbook(table, origin)).toBlob(), `${fileStem(table, origin)}.xlsx`);
};
