import type postgres from "postgres";

export type Covered = { tables: number; policies: number; foreignKeys: number; functions: number };
type Sql = postgres.Sql | postgres.TransactionSql;
type Row = Record<string, string>;
type Policy = { table: string; name: string; cmd: string; roles: string; conditions: string[] };

/** References out of the tenant's tables: a member is a person who exists across companies. */
const CROSSINGS = ["members.user_id"];
/** As PostgreSQL writes it back: the company and (who), never the company or something else. */
const COMPANY_FIRST = "((company_id = ( SELECT app.company_id() AS company_id)) AND ";

/** Everything in PostgreSQL's own catalog that breaks the rules of the one door. `sql` is the owner's connection. */
export async function doorFindings(sql: Sql): Promise<{ findings: string[]; covered: Covered }> {
  const tables = await sql<Row[]>`
    select c.relname as name, c.relrowsecurity::text as enabled, c.relforcerowsecurity::text as forced,
           (select a.attname from pg_index i join pg_attribute a on a.attrelid = c.oid and a.attnum = i.indkey[0]
             where i.indrelid = c.oid and i.indisprimary) as leads,
           has_table_privilege('coastdown_app', c.oid, 'TRUNCATE, REFERENCES, TRIGGER')::text as beyond
      from pg_class c where c.relnamespace = 'public'::regnamespace and c.relkind in ('r', 'p') order by 1`;
  const policies = await sql<Policy[]>`
    select tablename as "table", policyname as name, cmd, array_to_string(roles, ',') as roles,
           array_remove(array[qual, with_check], null) as conditions
      from pg_policies where schemaname = 'public'`;
  const keys = await sql<Row[]>`
    select c.conname as name, c.conrelid::regclass::text as "table", c.confrelid::regclass::text as target,
           (select a.attname from pg_attribute a where a.attrelid = c.conrelid and a.attnum = c.conkey[1]) as leads,
           (select a.attname from pg_attribute a where a.attrelid = c.confrelid and a.attnum = c.confkey[1]) as "leadsTarget"
      from pg_constraint c where c.contype = 'f' and c.connamespace = 'public'::regnamespace`;
  const functions = await sql<Row[]>`
    select p.oid::regprocedure::text as name, pg_get_userbyid(p.proowner) as owner,
           coalesce(array_to_string(p.proconfig, ','), '') as config
      from pg_proc p where p.prosecdef and p.pronamespace::regnamespace::text not in ('pg_catalog', 'information_schema')`;
  const findings = [
    ...tables.flatMap((table) => tableFindings(table, policies)),
    ...policies.flatMap(policyFindings),
    ...keys.flatMap(keyFindings),
    ...functions.flatMap(functionFindings),
    ...(await roleFindings(sql)),
    ...(await trailFindings(sql)),
    ...(await viewFindings(sql)),
  ];
  const covered = {
    tables: tables.length,
    policies: policies.length,
    foreignKeys: keys.length,
    functions: functions.length,
  };
  return { findings, covered };
}

function tableFindings({ name, enabled, forced, leads, beyond }: Row, policies: Policy[]): string[] {
  const own = policies.filter((policy) => policy.table === name && policy.roles === "coastdown_app");
  const has = (command: string) => own.some((policy) => policy.cmd === command);
  return [
    ...(leads === "company_id" ? [] : [`${name}: the primary key leads with ${leads}`]),
    ...(enabled === "true" ? [] : [`${name}: row-level security is off`]),
    ...(forced === "true" ? [] : [`${name}: row-level security is not forced`]),
    ...(has("SELECT") ? [] : [`${name}: no policy says who may read`]),
    ...(has("INSERT") ? [] : [`${name}: no policy says who may add`]),
    ...(beyond === "false" ? [] : [`${name}: the application may empty it, refer to it or put triggers on it`]),
  ];
}

/** Only the gate's own policies may do without the company. */
const policyFindings = ({ table, name, roles, conditions }: Policy): string[] =>
  roles === "coastdown_gate" || conditions.every((condition) => condition.startsWith(COMPANY_FIRST))
    ? []
    : [`${table}: policy ${name} forgets the company`];

function keyFindings({ name, table, target, leads, leadsTarget }: Row): string[] {
  if (CROSSINGS.includes(`${table}.${leads}`) && target?.startsWith("identity.")) return [];
  return leads === "company_id" && leadsTarget === "company_id" ? [] : [`${name} does not lead with the company`];
}

const functionFindings = ({ name, owner, config }: Row): string[] => [
  ...(owner === "coastdown_gate" ? [] : [`${name} acts as ${owner}, not as the gate`]),
  ...(config?.includes("search_path=") ? [] : [`${name} has no fixed search_path`]),
];

async function roleFindings(sql: Sql): Promise<string[]> {
  const roles = await sql<Row[]>`
    select rolname as name, (rolsuper or rolbypassrls or rolcreaterole)::text as mighty, rolcanlogin::text as login
      from pg_roles where rolname in ('coastdown_app', 'coastdown_gate')`;
  const owned = await sql<Row[]>`
    select pg_describe_object(classid, objid, objsubid) as name from pg_shdepend
     where refclassid = 'pg_authid'::regclass and refobjid = 'coastdown_app'::regrole and deptype = 'o'
       and dbid in (0, (select oid from pg_database where datname = current_database()))`;
  const joined = await sql<Row[]>`
    select roleid::regrole::text as name from pg_auth_members where member = 'coastdown_app'::regrole`;
  return [
    ...roles.filter((role) => role.mighty === "true").map(({ name }) => `${name} can pass row-level security by`),
    ...roles.filter((r) => r.name === "coastdown_gate" && r.login === "true").map(() => "the gate can sign in"),
    ...owned.map(({ name }) => `the application owns ${name}`),
    ...joined.map(({ name }) => `the application can act as ${name}`),
    ...(roles.length === 2 ? [] : ["a role is missing"]),
  ];
}

async function trailFindings(sql: Sql): Promise<string[]> {
  const rights = await sql<Row[]>`
    select word as name from unnest(array['UPDATE', 'DELETE', 'TRUNCATE']) word
     where has_table_privilege('coastdown_app', 'audit_entries', word)
        or (word = 'UPDATE' and has_any_column_privilege('coastdown_app', 'audit_entries', word))`;
  const policies = await sql<Row[]>`
    select policyname as name from pg_policies where tablename = 'audit_entries' and cmd not in ('SELECT', 'INSERT')`;
  return [
    ...rights.map(({ name }) => `the audit trail may be changed: ${name}`),
    ...policies.map(({ name }) => `the audit trail has a policy ${name}`),
  ];
}

/** A view asks with its owner's rights unless told otherwise. */
async function viewFindings(sql: Sql): Promise<string[]> {
  const views = await sql<Row[]>`
    select relname as name from pg_class where relnamespace = 'public'::regnamespace and relkind in ('v', 'm', 'f')
       and not coalesce(reloptions @> array['security_invoker=true'], false)`;
  return views.map(({ name }) => `${name} is a view with its owner's rights`);
}
