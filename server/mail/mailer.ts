export type Mail = { to: string; subject: string; text: string }

/** Sends one mail; resolves when the mail server has taken it. */
export interface Mailer {
  send(mail: Mail): Promise<void>
}
