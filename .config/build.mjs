import { ensureBuild, ensurePackages } from './ensure.mjs';

ensurePackages();
ensureBuild();
