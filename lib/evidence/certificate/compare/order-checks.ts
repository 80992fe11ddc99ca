import { plainKey } from '../match/alike';
import { areSameCompany } from '../match/same-company';
import { namesOrder } from '../match/same-order-number';
import { STEPS } from './cycle-checks';
import type { Check } from './compared';
import { meets, notStated, observed, wrong } from './outcome';

/** It names the order, and not another batch. A wrong order is not told again as a wrong batch. */
export const namesItsOrder: Check = ({ stated, order, orders, isRecognised }) => {
  const asked = { requirement: `order ${order.po}`, ordered: order.po, stated: stated.purchase_order };
  const other = orders.find(
    ({ batch }) =>
      stated.batch !== null && batch !== order.batch && plainKey(batch) === plainKey(stated.batch),
  );
  if (stated.purchase_order !== null && !namesOrder(stated.purchase_order, order.po, isRecognised)) {
    const { purchase_order: written } = stated;
    const whose = orders.find(({ po, batch }) => batch !== order.batch && namesOrder(written, po));
    return [
      wrong(
        'wrong_po',
        asked,
        `The certificate names order ${written}, the batch left on ${order.po}.${whose ? ` ${whose.po} is batch ${whose.batch}.` : ''}`,
      ),
    ];
  }
  return [
    stated.purchase_order === null ? notStated(asked) : meets(asked, 'It is the order.'),
    ...(other
      ? [
          wrong(
            'wrong_batch',
            { requirement: null, ordered: order.batch, stated: stated.batch },
            `The certificate names batch ${other.batch}, which is order ${other.po}; this one is ${order.batch}.`,
          ),
        ]
      : []),
  ];
};

/** Who writes the certificate need not have the order's spelling; another company is told, and people decide. */
export const comesFromProcessor: Check = ({ stated, order }) =>
  stated.processor === null || areSameCompany(stated.processor, order.processor.name)
    ? []
    : [
        observed(
          `The certificate comes from ${stated.processor}; the order was given to ${order.processor.name}.`,
        ),
      ];

const KNOWN = new Set([
  ...['alloy', 'temper_in', 'temper_out', 'quench', 'age', 'bake', 'hardness', 'conductivity_pct_iacs'],
  ...['thickness', 'tensile', 'tensile_ksi', 'ndt', 'penetrant', 'type', 'method', 'sensitivity', 'level'],
  ...['personnel_level', ...Object.keys(STEPS)],
]);

/** Requirements that are not known here are named, so that a person compares them. */
export const knowsWhatIsAsked: Check = ({ order: { requirements } }) =>
  Object.entries(requirements)
    .filter(([key, value]) => !KNOWN.has(key) && value != null)
    .map(([key, value]) =>
      observed(
        `The order also asks for ${key.replaceAll('_', ' ')}: ${typeof value === 'string' ? value : JSON.stringify(value)}. Compare it by eye.`,
      ),
    );
