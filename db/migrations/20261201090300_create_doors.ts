import type { Knex } from 'knex';

const doors = [
  'door_sign_in(text)',
  'door_found_firm(jsonb, text, text, text)',
  'door_add_member(text, text, text, text, boolean, boolean)',
  'door_count_try(text, timestamptz, integer, integer)',
  'door_forget_tries(text)',
].join(', ');

/** What must work before a firm is known, or beyond the app role's reach. Each runs as the owner and answers narrowly. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create function door_sign_in(wanted text)
      returns table (account_id uuid, firm_id uuid, password_hash text)
      language sql stable security definer set search_path = pg_catalog, public as $$
        select a.id, m.firm_id, a.password_hash
        from public.accounts a join public.memberships m on m.account_id = a.id
        where lower(a.email) = lower(wanted) order by m.created_at, m.firm_id limit 1
      $$;

    create function door_found_firm(firm jsonb, owner_name text, owner_email text, owner_hash text)
      returns table (firm_id uuid, account_id uuid)
      language sql volatile security definer set search_path = pg_catalog, public as $$
        with account as (
          insert into public.accounts (name, email, password_hash) values (owner_name, owner_email, owner_hash)
          on conflict ((lower(email))) do nothing returning id
        ), founded as (
          insert into public.firms (name, town, address, email, phone, currency, locale, paper, time_zone, units,
            quote_prefix, quote_valid_days, record_address)
          select f.name, f.town, f.address, f.email, f.phone, f."currency", f.locale, f.paper, f."timeZone", f.units,
            f."quotePrefix", f."quoteValidDays", f."recordAddress"
          from account, jsonb_to_record(firm) as f(name text, town text, address text, email text, phone text,
            "currency" text, locale text, paper text, "timeZone" text, units text, "quotePrefix" text,
            "quoteValidDays" integer, "recordAddress" text)
          returning id, units
        )
        insert into public.memberships (firm_id, account_id, role, may_send, sees_margin, units)
          select founded.id, account.id, 'owner', true, true, founded.units from founded, account
          returning firm_id, account_id
      $$;

    create function door_add_member(member_name text, member_email text, member_hash text, member_role text,
        member_may_send boolean, member_sees_margin boolean)
      returns uuid language sql volatile security definer set search_path = pg_catalog, public as $$
        with account as (
          insert into public.accounts (name, email, password_hash) values (member_name, member_email, member_hash)
          on conflict ((lower(email))) do nothing returning id
        )
        insert into public.memberships (firm_id, account_id, role, may_send, sees_margin, units)
          select f.id, account.id, member_role, member_may_send, member_sees_margin, f.units
          from account, public.firms f where f.id = current_setting('app.firm')::uuid
          returning account_id
      $$;

    -- 0, or the seconds to wait when there were more than 'most' tries since the count began
    create function door_count_try(tried text, moment timestamptz, most integer, seconds integer)
      returns integer language sql volatile security definer set search_path = pg_catalog, public as $$
        delete from public.tries where ends_at < moment - interval '1 day';
        insert into public.tries as t (key, count, ends_at) values (tried, 1, moment + make_interval(secs => seconds))
          on conflict (key) do update set
            count = case when t.ends_at <= moment then 1 else t.count + 1 end,
            ends_at = case when t.ends_at <= moment then excluded.ends_at else t.ends_at end
          returning case when count > most then greatest(1, ceil(extract(epoch from ends_at - moment)))::integer else 0 end
      $$;

    create function door_forget_tries(tried text)
      returns void language sql volatile security definer set search_path = pg_catalog, public as $$
        delete from public.tries where key = tried
      $$;

    revoke all on function ${doors} from public;
    grant execute on function ${doors} to thickset_app;
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`drop function ${doors}`);
}
