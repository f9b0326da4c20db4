import { benchExpressions } from './expressions.ts';
import { benchKinds } from './kinds.ts';
import { benchSpreadsheet } from './spreadsheet.ts';

benchKinds();
benchExpressions();
benchSpreadsheet();
