/** The verbs that actions begin with, as what was done. */
const DONE: Record<string, string> = {
  ...{ accept: 'accepted', acknowledge: 'acknowledged', add: 'added', announce: 'announced' },
  ...{ approve: 'approved', ask: 'asked', cancel: 'cancelled', change: 'changed', close: 'closed' },
  ...{ correct: 'corrected', count: 'counted', create: 'created', credit: 'credited', decide: 'decided' },
  ...{ dispatch: 'dispatched', dispose: 'decided', edit: 'edited', end: 'ended', enter: 'entered' },
  ...{ fit: 'fitted', invite: 'invited', judge: 'judged', make: 'made', mark: 'marked', move: 'moved' },
  ...{ open: 'opened', override: 'overrode', pay: 'paid', promise: 'promised', put: 'put', read: 'read' },
  ...{ receive: 'received', record: 'recorded', refuse: 'refused', reissue: 're-issued' },
  ...{ release: 'released', remove: 'removed', renew: 'renewed', reopen: 'reopened' },
  ...{ request: 'requested', reset: 'reset', retire: 'retired', retry: 'tried again', revise: 'revised' },
  ...{ revoke: 'revoked', save: 'saved', send: 'sent', set: 'set', share: 'shared', ship: 'shipped' },
  ...{ sign: 'signed', supersede: 'superseded', take: 'took', update: 'changed', waive: 'waived' },
  ...{ withdraw: 'withdrew' },
};

/** What was done, from `thing.verb_of_it`: "dispatched", "withdrew approval". What is no verb stays as it is. */
export function actionWords(action: string): string {
  const [verb = '', ...rest] = action.slice(action.indexOf('.') + 1).split(/[._]/);
  return [DONE[verb] ?? verb, ...rest].join(' ');
}
