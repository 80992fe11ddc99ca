-- The ledger of pieces. A movement lowers one balance and raises another in the same statement; the check
-- `never_negative` on balances refuses what is not there, and the row lock it takes puts two movements of the same
-- pieces one after the other. The function runs as the owner because the application may not write balances.
create function post_movement() returns trigger language plpgsql security definer set search_path = public as $$
declare
  lot_is_serialised boolean;
  moved integer;
begin
  select serialised into strict lot_is_serialised from lots where id = new.lot_id;
  if lot_is_serialised and new.piece_ids is null then
    raise exception 'pieces of a serialised lot are moved by name' using errcode = 'check_violation', constraint = 'serialised_by_name';
  end if;
  if not lot_is_serialised and new.piece_ids is not null then
    raise exception 'this lot has no named pieces' using errcode = 'check_violation', constraint = 'serialised_by_name';
  end if;

  if new.from_place is not null then
    update balances set pieces = pieces - new.pieces
     where lot_id = new.lot_id and place = new.from_place and holder_id = new.from_holder_id;
    if not found then
      raise exception 'no pieces there' using errcode = 'check_violation', constraint = 'never_negative';
    end if;
  elsif new.reason <> 'made' then
    raise exception 'pieces only come into being by being made' using errcode = 'check_violation', constraint = 'pieces_conserved';
  end if;

  insert into balances (shop_id, lot_id, place, holder_id, pieces)
       values (new.shop_id, new.lot_id, new.to_place, new.to_holder_id, new.pieces)
  on conflict (lot_id, place, holder_id) do update set pieces = balances.pieces + excluded.pieces;

  if new.piece_ids is not null then
    update pieces set place = new.to_place, holder_id = new.to_holder_id
     where id = any (new.piece_ids) and lot_id = new.lot_id
       and place is not distinct from new.from_place and holder_id is not distinct from new.from_holder_id;
    get diagnostics moved = row_count;
    if moved <> new.pieces then
      raise exception 'not all named pieces are there' using errcode = 'check_violation', constraint = 'never_negative';
    end if;
  end if;
  return new;
end $$;
--> statement-breakpoint
create trigger post_movement before insert on movements for each row execute function post_movement();
--> statement-breakpoint
-- The audit chain. An entry's hash is the SHA-256 of the hash before it and of the entry as text; the lock makes one
-- chain of entries that are added at the same time.
create function audit_text(e audit_entries) returns text language sql stable parallel safe set timezone = 'UTC' as $$
  select jsonb_build_object('shop', e.shop_id, 'seq', e.seq, 'at', e.at, 'actorKind', e.actor_kind, 'actorId', e.actor_id,
    'actorName', e.actor_name, 'address', e.address, 'requestId', e.request_id, 'action', e.action, 'entity', e.entity,
    'entityId', e.entity_id, 'before', e.before, 'after', e.after)::text
$$;
--> statement-breakpoint
create function link_audit_entry() returns trigger language plpgsql security definer set search_path = public as $$
declare
  last_seq bigint;
  last_hash text;
begin
  perform pg_advisory_xact_lock(hashtextextended('audit:' || new.shop_id, 0));
  select seq, hash into last_seq, last_hash from audit_entries where shop_id = new.shop_id order by seq desc limit 1;
  new.seq := coalesce(last_seq, 0) + 1;
  new.previous_hash := coalesce(last_hash, '');
  new.hash := encode(sha256(convert_to(new.previous_hash || audit_text(new), 'UTF8')), 'hex');
  return new;
end $$;
--> statement-breakpoint
create trigger link_audit_entry before insert on audit_entries for each row execute function link_audit_entry();
--> statement-breakpoint
-- What is written once stays: not even the owner changes these rows without first taking the trigger away.
create function refuse_change() returns trigger language plpgsql as $$
begin
  raise exception '% is append-only', tg_table_name using errcode = 'insufficient_privilege';
end $$;
--> statement-breakpoint
create trigger append_only before update or delete on movements for each row execute function refuse_change();
--> statement-breakpoint
create trigger append_only before update or delete on audit_entries for each row execute function refuse_change();
--> statement-breakpoint
create trigger append_only before update or delete on money_entries for each row execute function refuse_change();
--> statement-breakpoint
create trigger append_only before update or delete on signatures for each row execute function refuse_change();
--> statement-breakpoint
create trigger append_only before update or delete on coverage for each row execute function refuse_change();
--> statement-breakpoint
-- A verified file is evidence: its description never changes again.
create function keep_verified_file() returns trigger language plpgsql as $$
begin
  if tg_op = 'DELETE' then
    if old.state = 'verified' then raise exception 'a verified file is never deleted' using errcode = 'insufficient_privilege'; end if;
    return old;
  end if;
  if old.state = 'verified' and (new.sha256, new.size, new.storage_key, new.state, new.media_type, new.shop_id, new.purpose)
      is distinct from (old.sha256, old.size, old.storage_key, old.state, old.media_type, old.shop_id, old.purpose) then
    raise exception 'a verified file never changes' using errcode = 'insufficient_privilege';
  end if;
  return new;
end $$;
--> statement-breakpoint
create trigger keep_verified_file before update or delete on files for each row execute function keep_verified_file();
