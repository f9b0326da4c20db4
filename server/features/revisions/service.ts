/** What other features may ask of revisions. */
export { changeRevision } from './change-service.ts';
export { contentHashOf, verifyContent } from './content-service.ts';
export { isCurrent, isIssued, maySee } from './policy.ts';
export { peopleOf, presentSummary } from './presenter.ts';
export { definitionOf, findVisible, visibleRevision } from './read-service.ts';
export { keepSave } from './save-service.ts';
export {
  lockRevision,
  publishRevision,
  returnRevision,
  signRevision,
  submitRevision,
  withdrawRevision,
} from './life-service.ts';
