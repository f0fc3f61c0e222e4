import type { Knex } from 'knex';

const doors = ['door_open_link(bytea, timestamptz, text, text)', 'door_link_pdf(bytea, timestamptz, text, text)'].join(
  ', ',
);

/** A private link opens without an account: each door answers for one token, and records that it was opened. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    create function link_state(expires_at timestamptz, revoked_at timestamptz, newer text, moment timestamptz)
      returns text language sql immutable as $$
        select case
          when revoked_at is not null then 'revoked'
          when expires_at <= moment then 'expired'
          when newer is not null then 'superseded'
          else 'current'
        end
      $$;

    create function latest_letter(firm uuid, job uuid, than integer)
      returns text language sql stable as $$
        select r.letter from public.revisions r
        where r.firm_id = firm and r.job_id = job and r.ordinal > than order by r.ordinal desc limit 1
      $$;

    create function door_open_link(token bytea, moment timestamptz, address text, agent text)
      returns table (state text, superseded_by text, contact_name text, pdf_bytes integer, snapshot jsonb)
      language sql volatile security definer set search_path = pg_catalog, public as $$
        with found as (
          select l.firm_id, l.id, m.to_name, r.pdf_bytes, r.snapshot, newer.letter,
            public.link_state(l.expires_at, l.revoked_at, newer.letter, moment) as state
          from public.links l
            join public.messages m on m.firm_id = l.firm_id and m.id = l.message_id
            join public.revisions r on r.firm_id = m.firm_id and r.id = m.revision_id
            cross join lateral (select public.latest_letter(r.firm_id, r.job_id, r.ordinal) as letter) newer
          where l.token_hash = token
        ), opened as (
          insert into public.link_openings (firm_id, link_id, opened_at, what, address, agent)
          select f.firm_id, f.id, moment, 'page', address, agent from found f
        )
        select f.state, f.letter, f.to_name, f.pdf_bytes,
          case when f.state in ('current', 'superseded') then f.snapshot end
        from found f
      $$;

    create function door_link_pdf(token bytea, moment timestamptz, address text, agent text)
      returns table (number text, letter text, date text, hash text, bytes bytea)
      language sql volatile security definer set search_path = pg_catalog, public as $$
        with found as (
          select l.firm_id, l.id, r.snapshot #>> '{job,number}' as number, r.letter, r.pdf_hash, r.pdf,
            to_char(r.frozen_at at time zone (r.snapshot ->> 'timeZone'), 'YYYY-MM-DD') as date
          from public.links l
            join public.messages m on m.firm_id = l.firm_id and m.id = l.message_id
            join public.revisions r on r.firm_id = m.firm_id and r.id = m.revision_id
          where l.token_hash = token and r.pdf is not null
            and public.link_state(l.expires_at, l.revoked_at, null, moment) = 'current'
        ), opened as (
          insert into public.link_openings (firm_id, link_id, opened_at, what, address, agent)
          select f.firm_id, f.id, moment, 'pdf', address, agent from found f
        )
        select f.number, f.letter, f.date, f.pdf_hash, f.pdf from found f
      $$;

    revoke all on function ${doors} from public;
    grant execute on function ${doors} to thickset_app;
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`drop function ${doors}`);
  await knex.raw(
    'drop function latest_letter(uuid, uuid, integer), link_state(timestamptz, timestamptz, text, timestamptz)',
  );
}
