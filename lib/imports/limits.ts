/** How large a file may be, in megabytes. The browser reads this too. */

/** The largest file that is taken; ten years of a large contractor are a tenth of it. */
export const MOST_FILE_MB = 100;

/** An Excel file is unpacked in memory as a whole, unlike a CSV file. */
export const MOST_XLSX_MB = 20;
