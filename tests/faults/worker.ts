import '@/lib/jobs/all-jobs';

import { whenTold } from './when-told';

/** The product's worker, loaded beforehand: in its bundle it is the program itself, so to import it is to run it. */
whenTold(() => void import('@/lib/jobs/worker'));
