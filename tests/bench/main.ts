import { benchSpreadsheet } from './spreadsheet.ts';

benchSpreadsheet();
