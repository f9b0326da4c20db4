/** Changes whenever a published number could change; CHANGELOG.md says why. */
export const ENGINE_VERSION = '1.0.0';
