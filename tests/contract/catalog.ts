import type postgres from "postgres";

export type Covered = { tables: number; policies: number; foreignKeys: number; functions: number };

type Row = Record<string, string>;

/** References out of the tenant's tables: a member is a person who exists across companies. */
const CROSSINGS = ["members.user_id"];

/**
 * Everything in PostgreSQL's own catalog that breaks the rule of the one door. `sql` is a connection of the owner.
 */
export async function doorFindings(
  sql: postgres.Sql | postgres.TransactionSql,
): Promise<{ findings: string[]; covered: Covered }> {
  const tables = await sql<Row[]>`
    select c.oid::text as oid, c.relname as name, c.relrowsecurity::text as enabled, c.relforcerowsecurity::text as forced,
           (select a.attname from pg_index i join pg_attribute a on a.attrelid = c.oid and a.attnum = i.indkey[0]
             where i.indrelid = c.oid and i.indisprimary) as leads
      from pg_class c where c.relnamespace = 'public'::regnamespace and c.relkind in ('r', 'p') order by 2`;
  const policies = await sql<Row[]>`
    select tablename as "table", policyname as name, cmd, array_to_string(roles, ',') as roles,
           coalesce(qual, '') || ' ' || coalesce(with_check, '') as condition
      from pg_policies where schemaname = 'public'`;
  const keys = await sql<Row[]>`
    select c.conname as name, c.conrelid::regclass::text as "table", c.confrelid::regclass::text as target,
           (select a.attname from pg_attribute a where a.attrelid = c.conrelid and a.attnum = c.conkey[1]) as leads,
           (select a.attname from pg_attribute a where a.attrelid = c.confrelid and a.attnum = c.confkey[1]) as "leadsTarget"
      from pg_constraint c where c.contype = 'f' and c.connamespace = 'public'::regnamespace`;
  const functions = await sql<Row[]>`
    select p.oid::regprocedure::text as name, pg_get_userbyid(p.proowner) as owner,
           coalesce(array_to_string(p.proconfig, ','), '') as config
      from pg_proc p where p.prosecdef and p.pronamespace in ('public'::regnamespace, 'app'::regnamespace)`;
  const roles = await sql<Row[]>`
    select rolname as name, rolsuper::text as super, rolbypassrls::text as bypass, rolcanlogin::text as login
      from pg_roles where rolname in ('coastdown_app', 'coastdown_gate')`;
  const owned = await sql<Row[]>`
    select c.relname as name from pg_class c where pg_get_userbyid(c.relowner) = 'coastdown_app'`;
  const trail = await sql<Row[]>`
    select privilege_type as name from information_schema.role_table_grants
     where table_name = 'audit_entries' and grantee = 'coastdown_app' and privilege_type in ('UPDATE', 'DELETE', 'TRUNCATE')`;

  const findings = [
    ...tables.flatMap((table) => tableFindings(table, policies)),
    ...policies.flatMap(policyFindings),
    ...keys.flatMap(keyFindings),
    ...functions.flatMap(({ name, owner, config }) => [
      ...(owner === "coastdown_gate" ? [] : [`${name} acts as ${owner}, not as the gate`]),
      ...(config?.includes("search_path=") ? [] : [`${name} has no fixed search_path`]),
    ]),
    ...roles.flatMap(({ name, super: all, bypass, login }) => [
      ...(all === "true" || bypass === "true" ? [`${name} can pass row-level security by`] : []),
      ...(name === "coastdown_gate" && login === "true" ? ["the gate can sign in"] : []),
    ]),
    ...owned.map(({ name }) => `the application owns ${name}`),
    ...trail.map(({ name }) => `the audit trail allows ${name}`),
  ];
  const covered = {
    tables: tables.length,
    policies: policies.length,
    foreignKeys: keys.length,
    functions: functions.length,
  };
  return { findings, covered };
}

function tableFindings({ name, enabled, forced, leads }: Row, policies: Row[]): string[] {
  const own = policies.filter((policy) => policy.table === name && policy.roles === "coastdown_app");
  const has = (command: string) => own.some((policy) => policy.cmd === command);
  return [
    ...(leads === "company_id" ? [] : [`${name}: the primary key leads with ${leads}`]),
    ...(enabled === "true" ? [] : [`${name}: row-level security is off`]),
    ...(forced === "true" ? [] : [`${name}: row-level security is not forced`]),
    ...(has("SELECT") ? [] : [`${name}: no policy says who may read`]),
    ...(has("INSERT") ? [] : [`${name}: no policy says who may add`]),
  ];
}

/** Only the gate's own policies may do without the company. */
const policyFindings = ({ table, name, roles, condition }: Row): string[] =>
  roles === "coastdown_gate" || condition?.includes("app.company_id()")
    ? []
    : [`${table}: policy ${name} forgets the company`];

function keyFindings({ name, table, target, leads, leadsTarget }: Row): string[] {
  if (CROSSINGS.includes(`${table}.${leads}`) && target?.startsWith("identity.")) return [];
  return leads === "company_id" && leadsTarget === "company_id" ? [] : [`${name} does not lead with the company`];
}
