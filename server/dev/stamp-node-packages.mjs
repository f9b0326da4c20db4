import { stampNodePackages } from './node-packages.mjs';

stampNodePackages();
