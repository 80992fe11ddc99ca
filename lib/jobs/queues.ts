interface QueueRules {
  name: string;
  retries: number;
  retryDelayS: number;
  /** The queue that gets a job's payload once all its tries failed, also where the worker died of it each time. */
  givesUpTo?: string;
}

/**
 * Every queue there is, with how often and how far apart its jobs are tried again (the pause doubles each time). Known
 * apart from the jobs' code, so that the web server can queue what only the worker can do.
 */
export const QUEUES = [
  { name: 'send-mail', retries: 14, retryDelayS: 5 },
  { name: 'render-documents', retries: 8, retryDelayS: 2 },
  { name: 'pay-invoice', retries: 14, retryDelayS: 5 },
  { name: 'work-payment-event', retries: 10, retryDelayS: 2 },
  { name: 'assemble-dossier', retries: 6, retryDelayS: 5 },
  { name: 'read-document', retries: 4, retryDelayS: 5, givesUpTo: 'give-up-reading' },
  { name: 'give-up-reading', retries: 4, retryDelayS: 5 },
] as const satisfies readonly QueueRules[];
