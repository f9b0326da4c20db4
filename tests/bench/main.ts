import { benchExpressions } from './expressions.ts';
import { benchSpreadsheet } from './spreadsheet.ts';

benchExpressions();
benchSpreadsheet();
