import type { Knex } from 'knex';

/** The way of a design basis from draft to issued: its state is what was done with it, and who may do it. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    alter table design_bases drop column state;
    comment on table design_bases is
      'each saved change is a new revision; the issued one is in force, and where none is issued the highest one';

    create table design_basis_moves (
      id bigint generated always as identity constraint design_basis_moves_pkey primary key,
      basis_id uuid not null constraint design_basis_moves_basis_id_fkey references design_bases (id),
      move text not null,
      "by" uuid not null constraint design_basis_moves_by_fkey references users (id),
      at timestamptz not null default now(),
      note text not null default '',
      constraint design_basis_moves_move_check check (move in ('submit', 'return', 'check', 'issue', 'withdraw')),
      constraint design_basis_moves_note_check check (move not in ('return', 'withdraw') or length(btrim(note)) > 0)
    );
    create index design_basis_moves_basis_id_index on design_basis_moves (basis_id, id);
    comment on table design_basis_moves is 'what was done with a revision of a design basis, in order; never changed';
    grant select, insert on design_basis_moves to bellgap_app;

    create view design_basis_states as
      select b.id as basis_id, b.project_id, b.revision,
        case
          when last.move is null or last.move = 'return' then 'draft'
          when last.move = 'submit' then 'in_check'
          when last.move = 'check' then 'checked'
          when last.move = 'withdraw' then 'withdrawn'
          when exists (
            select from design_bases as newer join design_basis_moves as m on m.basis_id = newer.id
            where newer.project_id = b.project_id and newer.revision > b.revision and m.move = 'issue'
          ) then 'superseded'
          else 'issued'
        end as state
      from design_bases as b
      left join lateral (
        select m.move from design_basis_moves as m where m.basis_id = b.id order by m.id desc limit 1
      ) as last on true;
    comment on view design_basis_states is 'where each revision of a design basis stands, from its moves';
    grant select on design_basis_states to bellgap_app;

    create function basis_in_force(project uuid) returns integer language sql stable as $$
      select coalesce(
        (select max(revision) from design_basis_states where project_id = project and state = 'issued'),
        (select max(revision) from design_bases where project_id = project)
      )
    $$;
    comment on function basis_in_force is
      'the revision that specifications of a project rest on: the issued one; where none is issued, the highest';
    grant execute on function basis_in_force to bellgap_app;

    create function guard_design_basis_move() returns trigger language plpgsql as $$
    declare
      basis design_bases%rowtype;
      stands text;
      checker uuid;
    begin
      select * into strict basis from design_bases where id = new.basis_id;
      -- One after the other for each project: the product may not lock rows of design_bases.
      perform pg_advisory_xact_lock(hashtextextended('design basis ' || basis.project_id, 0));
      select state into strict stands from design_basis_states where basis_id = new.basis_id;
      if (stands, new.move) not in (
        ('draft', 'submit'), ('in_check', 'check'), ('in_check', 'return'), ('checked', 'return'),
        ('checked', 'issue'), ('issued', 'withdraw')
      ) or (new.move = 'issue' and exists (
        select from design_bases as newer join design_basis_moves as m on m.basis_id = newer.id
        where newer.project_id = basis.project_id and newer.revision > basis.revision and m.move = 'issue'
      )) then
        raise exception 'A design basis that is % cannot take the move %.', stands, new.move
          using errcode = '23514', constraint = 'design_basis_moves_order';
      end if;
      if new.move in ('check', 'issue') and new."by" = basis.created_by then
        raise exception 'Who wrote a design basis can neither check nor issue it.'
          using errcode = '23514', constraint = 'design_basis_moves_own_work';
      end if;
      if new.move = 'issue' then
        select m."by" into strict checker from design_basis_moves as m
          where m.basis_id = new.basis_id and m.move = 'check' order by m.id desc limit 1;
        if checker = new."by" then
          raise exception 'Who checked a design basis cannot issue it.'
            using errcode = '23514', constraint = 'design_basis_moves_own_work';
        end if;
      end if;
      return new;
    end $$;
    create trigger design_basis_moves_guard before insert on design_basis_moves
      for each row execute function guard_design_basis_move();
    create trigger design_basis_moves_kept before update or delete on design_basis_moves
      for each row execute function refuse_change();
    create trigger design_basis_moves_no_truncate before truncate on design_basis_moves execute function refuse_change();
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    drop function basis_in_force(uuid);
    drop view design_basis_states;
    drop table design_basis_moves;
    drop function guard_design_basis_move();
    alter table design_bases
      add column state text not null default 'draft',
      add constraint design_bases_state_check
        check (state in ('draft', 'in_check', 'checked', 'issued', 'superseded', 'withdrawn'));
    comment on table design_bases is 'each saved change is a new revision; the highest revision of a project is the present one';
  `);
}
