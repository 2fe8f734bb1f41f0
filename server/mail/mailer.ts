export interface Message {
  readonly to: string
  readonly subject: string
  readonly text: string
}

/** Sends one message; resolves when it was handed over, to the local outbox or to the mail server. */
export interface Mailer {
  send(message: Message): Promise<void>
}
