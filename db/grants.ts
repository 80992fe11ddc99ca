/**
 * What each role of the application may do with each table: the first of the two fences, beside the row policies.
 * `migrate` applies it whole after every migration; a table that is not named here is out of reach for all three roles.
 */
type Verb = 'select' | 'insert' | 'update' | 'delete';
type Columns = Partial<Record<Verb, readonly string[]>>;

const READ = ['select'] as const;
const ADD = ['select', 'insert'] as const;
const KEEP = ['select', 'insert', 'update'] as const;
const EDIT = ['select', 'insert', 'update', 'delete'] as const;

const ENTRY_OF_A_TABLE = [
  'id',
  'shop_id',
  'table_id',
  'title',
  'edition',
  'clause',
  'rows',
  'entered_by',
  'entered_by_name',
  'superseded_at',
  'withdrawn_at',
  'withdrawn_by',
  'created_at',
];

/** The shop's side. Append-only tables have no update and no delete; balances are the ledger's alone. */
export const SHOP_GRANTS: Record<string, readonly Verb[] | Columns> = {
  shops: ['select', 'update'],
  processors: READ,
  shop_processors: KEEP,
  approvals: KEEP,
  equipment: KEEP,
  // Rows of an entry never change; it is only followed by another or withdrawn.
  reference_tables: {
    select: ENTRY_OF_A_TABLE,
    insert: ENTRY_OF_A_TABLE,
    update: ['superseded_at', 'withdrawn_at', 'withdrawn_by'],
  },
  counters: KEEP,
  users: {
    select: ['id', 'email', 'name', 'active', 'units', 'single_keys', 'session_version', 'created_at'],
    update: ['name', 'units', 'single_keys', 'session_version'],
  },
  memberships: KEEP,
  invitations: KEEP,
  api_tokens: KEEP,
  idempotency_keys: KEEP,
  files: KEEP,
  parts: KEEP,
  route_steps: EDIT,
  assemblies: KEEP,
  assembly_needs: EDIT,
  lots: KEEP,
  pieces: ['select', 'insert'],
  movements: ADD,
  balances: READ,
  locations: KEEP,
  batches: KEEP,
  batch_lines: EDIT,
  requirements: EDIT,
  overrides: ['select', 'insert', 'delete'],
  batch_documents: KEEP,
  batch_links: KEEP,
  promises: ADD,
  messages: ADD,
  receipts: ADD,
  receipt_lines: ADD,
  receipt_photos: ADD,
  certificates: KEEP,
  charts: ADD,
  readings: KEEP,
  reading_corrections: ADD,
  intake: KEEP,
  decisions: KEEP,
  signatures: ADD,
  coverage: ADD,
  nonconformances: KEEP,
  dispositions: ADD,
  releases: ADD,
  dossier_links: KEEP,
  dossiers: KEEP,
  invoices: KEEP,
  invoice_lines: EDIT,
  clearances: EDIT,
  payments: KEEP,
  money_entries: ADD,
  audit_entries: ADD,
};

/** The processor's side reads; what it says is written in the shop's name after its own eyes have seen the batch. */
export const PORTAL_GRANTS: Record<string, readonly Verb[] | Columns> = {
  shops: { select: ['id', 'name', 'address', 'phone', 'zone', 'currency'] },
  processors: {
    select: ['id', 'name', 'email', 'phone', 'address', 'zone', 'stripe_account_id', 'payouts_ready'],
    update: ['name', 'phone', 'address', 'zone', 'stripe_account_id', 'payouts_ready'],
  },
  shop_processors: { select: ['shop_id', 'processor_id', 'contact_name', 'contact_email', 'active'] },
  users: {
    select: ['id', 'email', 'name', 'active', 'units', 'single_keys', 'session_version'],
    update: ['name', 'units', 'single_keys', 'session_version'],
  },
  memberships: READ,
  idempotency_keys: KEEP,
  files: READ,
  batches: {
    select: [
      'id',
      'shop_id',
      'number',
      'order_number',
      'processor_id',
      'process',
      'specification',
      'specification_revision',
      'class_type',
      'note',
      'leaves_on',
      'wanted_back_on',
      'currency',
      'lot_minimum_minor',
      'certification_fee_minor',
      'dispatched_at',
      'cancelled_at',
      'acknowledged_at',
      'acknowledged_pieces',
      'marked_done_at',
      'shipped_at',
      'shipped_note',
      'stage',
      'pieces',
      'pieces_back',
      'first_promised_on',
      'promised_on',
      'last_back_at',
      'version',
      'created_at',
    ],
  },
  batch_lines: READ,
  requirements: READ,
  batch_documents: {
    select: [
      'id',
      'shop_id',
      'batch_id',
      'kind',
      'document_version',
      'changes',
      'stated_at',
      'file_id',
      'sha256',
    ],
  },
  promises: READ,
  messages: READ,
  receipts: READ,
  certificates: {
    select: [
      'id',
      'shop_id',
      'batch_id',
      'file_id',
      'number',
      'dated_on',
      'sent_by',
      'set_aside_at',
      'set_aside_reason',
      'created_at',
    ],
  },
  charts: READ,
  invoices: {
    select: [
      'id',
      'shop_id',
      'batch_id',
      'processor_id',
      'file_id',
      'number',
      'dated_on',
      'due_on',
      'currency',
      'total_minor',
      'sent_by',
      'refused_at',
      'refused_reason',
      'approved_at',
      'created_at',
    ],
  },
};

/** Who is this? Nothing of the shop's work is in reach. */
export const DOOR_GRANTS: Record<string, readonly Verb[] | Columns> = {
  shops: { select: ['id', 'name', 'zone', 'currency', 'phone'] },
  processors: ['select', 'insert', 'update'],
  shop_processors: { select: ['shop_id', 'processor_id', 'active', 'contact_email'] },
  users: KEEP,
  memberships: KEEP,
  invitations: KEEP,
  mailed_links: KEEP,
  api_tokens: {
    select: ['id', 'shop_id', 'user_id', 'token_hash', 'scopes', 'expires_at', 'revoked_at', 'name'],
    update: ['last_used_at'],
  },
  throttles: EDIT,
  idempotency_keys: KEEP,
  // What the page of a link says before anybody is signed in: what was asked, never a price.
  batches: {
    select: [
      'id',
      'shop_id',
      'processor_id',
      'number',
      'stage',
      'order_number',
      'process',
      'specification',
      'specification_revision',
      'class_type',
      'pieces',
      'wanted_back_on',
      'dispatched_at',
    ],
  },
  batch_links: {
    select: ['id', 'shop_id', 'batch_id', 'processor_id', 'token_hash', 'withdrawn_at', 'first_opened_at'],
    update: ['first_opened_at'],
  },
  dossier_links: {
    select: ['for_whom', 'id', 'shop_id', 'lot_id', 'token_hash', 'expires_at', 'withdrawn_at'],
  },
  payments: { select: ['id', 'shop_id', 'invoice_id', 'intent_id'] },
  payment_events: KEEP,
};

/** The statements that bring a database to exactly these grants, and policies to bear on the owner too. */
export function grantStatements(tables: readonly string[]): string[] {
  const statements = tables.flatMap((table) => [
    `revoke all on table "${table}" from app_shop, app_portal, app_door`,
    `alter table "${table}" enable row level security`,
  ]);
  for (const [role, grants] of [
    ['app_shop', SHOP_GRANTS],
    ['app_portal', PORTAL_GRANTS],
    ['app_door', DOOR_GRANTS],
  ] as const) {
    for (const [table, what] of Object.entries(grants)) {
      if (isVerbs(what)) statements.push(`grant ${what.join(', ')} on table "${table}" to ${role}`);
      else
        for (const [verb, columns] of Object.entries(what))
          statements.push(
            `grant ${verb} (${columns.map((c) => `"${c}"`).join(', ')}) on table "${table}" to ${role}`,
          );
    }
  }
  return statements;
}

const isVerbs = (what: readonly Verb[] | Columns): what is readonly Verb[] => Array.isArray(what);
