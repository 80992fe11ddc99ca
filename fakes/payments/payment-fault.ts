interface FaultDetail {
  type: 'api_error' | 'card_error' | 'idempotency_error' | 'invalid_request_error';
  message: string;
  code?: string;
  param?: string;
  decline_code?: string;
  payment_intent?: object;
}

/** A refusal in the form of the wire: `{"error": {"type", "code", "message", "param", …}}`. */
export class PaymentFault extends Error {
  constructor(
    readonly status: number,
    readonly detail: FaultDetail,
  ) {
    super(detail.message);
  }
}

export function invalid(
  message: string,
  { code, param, status = 400 }: { code?: string; param?: string; status?: number } = {},
): PaymentFault {
  return new PaymentFault(status, {
    type: 'invalid_request_error',
    message,
    ...(code === undefined ? {} : { code }),
    ...(param === undefined ? {} : { param }),
  });
}

/** Something named in the address is missing: 404. Named in a parameter: 400, as the real service answers. */
export function missing(noun: string, id: string, param?: string): PaymentFault {
  return invalid(`No such ${noun}: '${id}'`, {
    code: 'resource_missing',
    param: param ?? 'id',
    status: param === undefined ? 404 : 400,
  });
}
