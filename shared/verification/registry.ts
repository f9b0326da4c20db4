import { aiscChecks } from './aisc/index.ts';
import type { Check } from './check.ts';
import { csaChecks } from './csa/index.ts';
import { angleCleats } from './details/angle-cleats.ts';
import { endPlates } from './details/end-plate.ts';
import { finPlates } from './details/fin-plate.ts';
import { gussetPlatesNorthAmerica } from './details/gusset-north-american.ts';
import { gussetPlates } from './details/gusset-plate.ts';
import { enBearingTables } from './en/bearing-tables.ts';
import { enBolts } from './en/bolts.ts';
import { enTension } from './en/tension.ts';
import { enWelds } from './en/welds.ts';
import { enWorkedExamples } from './en/worked-examples.ts';
import { boltExamples } from './groups/bolt-examples.ts';
import { boltTables } from './groups/bolt-tables.ts';
import { weldExamples } from './groups/weld-examples.ts';
import { weldTables } from './groups/weld-tables.ts';
import { sansRuleEvaluations } from './sans/rule-evaluations.ts';
import { sansSameExpression } from './sans/same-expression.ts';
import { sansTension } from './sans/tension.ts';

/** Every comparison of the engine with a value from outside it. */
export const checks: readonly Check[] = [
  ...enBolts,
  ...enBearingTables,
  ...enWorkedExamples,
  ...enWelds,
  ...enTension,
  ...sansSameExpression,
  ...sansRuleEvaluations,
  ...sansTension,
  ...csaChecks,
  ...aiscChecks,
  ...boltTables,
  ...boltExamples,
  ...weldTables,
  ...weldExamples,
  ...gussetPlates,
  ...gussetPlatesNorthAmerica,
  ...finPlates,
  ...endPlates,
  ...angleCleats,
];
