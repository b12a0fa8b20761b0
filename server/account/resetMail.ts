import { type AppContext } from '../context.ts'

export type ResetMail = (email: string, token: string) => void

/**
 * Sends the link for a new password without being waited for: the time a mail server takes would tell that the account exists.
 * The token stands behind `#`, so it reaches no server, log or referrer on the way.
 */
export const resetMail = ({ mailer, settings, logger }: Pick<AppContext, 'mailer' | 'settings' | 'logger'>): ResetMail => (email, token) => {
  const link = `${settings.publicUrl ?? `http://${settings.host}:${settings.port}`}/reset-password#${token}`
  mailer.send({
    to: email,
    subject: 'Set a new password for Proofcloth',
    text: [
      'Someone asked for a new password for this address.',
      'To set one, open this link within an hour; it works once:',
      link,
      'If this was not you, do nothing: your password stays as it is.',
    ].join('\n\n'),
  }).catch((error: unknown) => logger.error({ reason: error instanceof Error ? error.name : 'unknown' }, 'the reset mail could not be sent'))
}
