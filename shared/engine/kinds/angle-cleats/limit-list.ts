import type { ClauseKey } from '../../standards/basis.ts';
import type { FailingPart } from '../../types.ts';

/** `clause` names the check that the basis cites for it. */
interface LimitState {
  readonly id: string;
  readonly code: string;
  readonly title: string;
  readonly part: FailingPart;
  readonly clause: ClauseKey;
}

const state = (
  id: string,
  code: string,
  title: string,
  part: FailingPart,
  clause: ClauseKey,
): LimitState => ({ id, code, title, part, clause });

/** The limit states in the order they are printed; `evaluate` fills its array in the same order. */
export const limitStates = [
  state('bolt-shear', 'BS', 'Bolts in the web in shear', 'bolt', 'boltShear'),
  state('cleat-bearing', 'CB', 'Bearing and tear-out on the web legs', 'plate', 'bearing'),
  state('web-bearing', 'MB', 'Bearing and tear-out on the web', 'member', 'bearing'),
  state('cleat-gross-shear', 'CV', 'Gross shear of the cleats', 'plate', 'shearSection'),
  state('cleat-net-shear', 'CN', 'Net shear of the cleats', 'plate', 'shearSection'),
  state('cleat-tension', 'CT', 'Tension of the web legs', 'plate', 'tensionSection'),
  state('web-leg-block-shear', 'CX', 'Block shear in the web legs', 'plate', 'blockShear'),
  state('outstanding-leg-block-shear', 'CY', 'Block shear in the outstanding legs', 'plate', 'blockShear'),
  state('cleat-section-at-heel', 'CH', 'Section of the web legs at the heel', 'plate', 'plateSection'),
  state(
    'cleat-section-at-bolts',
    'CC',
    'Section of the web legs at the first column',
    'plate',
    'plateSection',
  ),
  state('outstanding-leg-bending', 'CF', 'Outstanding legs in bending and shear', 'plate', 'tStub'),
  state('support-bolt-shear', 'SS', 'Bolts at the support in shear', 'bolt', 'boltShear'),
  state('support-bolt-tension', 'ST', 'Bolts at the support in tension with prying', 'bolt', 'tStub'),
  state('support-bolt-combined', 'SC', 'Bolts at the support in shear and tension', 'bolt', 'boltCombined'),
  state('outstanding-leg-bearing', 'LB', 'Bearing and tear-out on the outstanding legs', 'plate', 'bearing'),
  state('support-bearing', 'SB', 'Bearing on the support', 'member', 'bearing'),
  state('weld-metal', 'WM', 'Weld metal at the support', 'weld', 'filletMetal'),
  state('weld-base-metal', 'WB', 'Base metal at the weld', 'weld', 'filletBaseMetal'),
  state('web-gross-shear', 'MV', 'Gross shear of the web', 'member', 'shearSection'),
  state('web-net-shear', 'MN', 'Net shear of the web', 'member', 'shearSection'),
  state('web-block-shear', 'MX', 'Block shear in the web', 'member', 'blockShear'),
  state('web-tension', 'MT', 'Tension of the web with its shear', 'member', 'webTension'),
  state('coped-section', 'MC', 'Coped section of the beam', 'member', 'plateSection'),
] as const;
