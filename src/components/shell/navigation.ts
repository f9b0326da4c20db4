import {
  mdiAccountGroupOutline,
  mdiAngleAcute,
  mdiBookOpenVariantOutline,
  mdiClipboardTextClockOutline,
  mdiCogOutline,
  mdiFileTableOutline,
  mdiHomeOutline,
  mdiProgressClock,
  mdiCheckDecagramOutline,
} from '@mdi/js';
import type { Me } from '@shared/contracts/auth.ts';

export interface Place {
  readonly name: string;
  readonly title: string;
  readonly icon: string;
  readonly needs?: keyof Me['can'];
}

const PLACES: readonly Place[] = [
  { name: 'home', title: 'Home', icon: mdiHomeOutline },
  { name: 'look-up', title: 'Look up', icon: mdiAngleAcute },
  { name: 'families', title: 'Families', icon: mdiBookOpenVariantOutline },
  { name: 'sweeps', title: 'Sweeps', icon: mdiProgressClock, needs: 'seeDrafts' },
  { name: 'exports', title: 'Exports', icon: mdiFileTableOutline },
  { name: 'verification', title: 'Verification', icon: mdiCheckDecagramOutline },
  { name: 'people', title: 'People', icon: mdiAccountGroupOutline, needs: 'managePeople' },
  { name: 'audit', title: 'Audit trail', icon: mdiClipboardTextClockOutline, needs: 'readAudit' },
  { name: 'settings', title: 'Settings', icon: mdiCogOutline },
];

/** The places that a person may go to, in the order of the rail. */
export const placesFor = (can: Me['can']): readonly Place[] =>
  PLACES.filter(({ needs }) => !needs || can[needs]);
