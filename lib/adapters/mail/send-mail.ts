import nodemailer, { type Transporter } from "nodemailer";
import { env } from "@/lib/env";

export type Mail = { to: string; subject: string; html: string; text: string; messageId: string };

let transport: Transporter | undefined;

/** Returns once the server has taken the letter. */
export async function sendMail(mail: Mail): Promise<void> {
  transport ??= nodemailer.createTransport(env().SMTP_URL);
  await transport.sendMail({ from: env().MAIL_FROM, ...mail });
}
