import type { z } from "zod";
import type { Tx } from "@/db/client";
import { asActor } from "@/db/door";
import { auditEntries } from "@/db/schema/audit";
import { type Actor, allowed, type Entered } from "@/lib/auth/actor";
import type { Permission } from "@/lib/domain/shared/permissions";
import { AppError, type FieldErrors } from "@/lib/errors";
import { translated } from "./database-errors";

/** How far long work is, for whoever waits. */
type Tell = (at: { step: string; done: number; of: number }) => void;
export type Context = { actor: Actor; now: Date; requestId?: string; progress?: Tell };
export type Inside = { tx: Tx; who: Entered; now: Date; progress: Tell };

type AuditWord = { entity: string; entityId: string; before?: unknown; after?: unknown };

type CommandDefinition<I extends z.ZodType, R> = {
  name: string;
  needs: Permission;
  input: I;
  /** Cannot type-check without saying what goes into the audit trail. */
  run: (inside: Inside, input: z.output<I>) => Promise<{ result: R; audit: AuditWord | AuditWord[] }>;
};

export type Verb<R = unknown> = ((context: Context, raw: unknown) => Promise<R>) & {
  verbName: string;
  needs: Permission;
  kind: "command" | "query";
};

export function parse<I extends z.ZodType>(schema: I, raw: unknown): z.output<I> {
  const parsed = schema.safeParse(raw);
  if (parsed.success) return parsed.data;
  const fieldErrors: FieldErrors = {};
  for (const issue of parsed.error.issues) {
    const path = issue.path.join(".");
    fieldErrors[path] = [...(fieldErrors[path] ?? []), issue.message];
  }
  throw new AppError("invalid", "Some entries need another look", fieldErrors);
}

/** Every write: permission, parse, transaction, run, audit entry in the same transaction. */
export function command<I extends z.ZodType, R>(definition: CommandDefinition<I, R>): Verb<R> {
  const { name, needs, input, run } = definition;
  return verb({ verbName: name, needs, kind: "command" }, (context, raw) =>
    enter(context, needs, "write", async ({ tx, who }) => {
      const { result, audit } = await run(insideOf(context, tx, who), parse(input, raw));
      await writeAudit(tx, who, context, name, audit);
      return result;
    }),
  );
}

type QueryDefinition<I extends z.ZodType, R> = {
  name: string;
  needs: Permission;
  input: I;
  run: (inside: Inside, input: z.output<I>) => Promise<R>;
};

/** Every read: the same door, in a transaction that cannot write. */
export function query<I extends z.ZodType, R>(definition: QueryDefinition<I, R>): Verb<R> {
  const { name, needs, input, run } = definition;
  return verb({ verbName: name, needs, kind: "query" }, (context, raw) =>
    enter(context, needs, "read", ({ tx, who }) => run(insideOf(context, tx, who), parse(input, raw))),
  );
}

const insideOf = ({ now, progress = () => {} }: Context, tx: Tx, who: Entered): Inside => ({ tx, who, now, progress });

type Facts = Pick<Verb, "verbName" | "needs" | "kind">;

const verb = <R>(facts: Facts, call: (context: Context, raw: unknown) => Promise<R>): Verb<R> =>
  Object.assign(call, facts);

async function enter<R>(
  { actor }: Context,
  needs: Permission,
  mode: "read" | "write",
  run: (inside: { tx: Tx; who: Entered }) => Promise<R>,
): Promise<R> {
  try {
    return await asActor(
      actor,
      (tx, who) => {
        if (!allowed(who, needs)) throw new AppError("forbidden", "You may not do that");
        return run({ tx, who });
      },
      mode,
    );
  } catch (error) {
    throw translated(error);
  }
}

async function writeAudit(tx: Tx, who: Entered, context: Context, name: string, audit: AuditWord | AuditWord[]) {
  const words = Array.isArray(audit) ? audit : [audit];
  if (words.length === 0) return;
  await tx.insert(auditEntries).values(
    words.map((word) => ({
      companyId: who.companyId,
      at: context.now,
      actorKind: who.kind,
      memberId: who.kind === "person" ? who.memberId : null,
      linkId: who.kind === "link" ? who.linkId : null,
      command: name,
      entity: word.entity,
      entityId: word.entityId,
      before: word.before ?? null,
      after: word.after ?? null,
      requestId: context.requestId ?? null,
    })),
  );
}
