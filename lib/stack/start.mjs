// Plain JavaScript without dependencies: this runs before anything is installed.
import { preparePackages } from './packages.mjs';

preparePackages();
// The loader can only be asked for once it is there.
await import('tsx');
await import('./start.ts');
