interface SmtpError extends Error {
  responseCode?: number;
  response?: string;
  command?: string;
  code?: string;
}

export interface DeliveryFailure {
  /** Trying again can't help: the server refused this very message or recipient for good. */
  permanent: boolean;
  /** For the mail log, without anything of the settings. */
  text: string;
}

/** The commands that are about one message; what fails before them (greeting, sign-in) hits all mails and can be mended. */
const messageCommands = new Set(['MAIL FROM', 'RCPT TO', 'DATA']);
const TEXT_LIMIT = 300;

/** Tells a refusal for good (RFC 5321: 5yz; an address no mail can have) from a trouble that passes. */
export function readFailure(error: unknown): DeliveryFailure {
  const { responseCode, response, command, code, message } = error as SmtpError;
  const refused = responseCode !== undefined && responseCode >= 500 && responseCode < 600;
  const text = response ?? (code === undefined ? message : `${code}: ${message}`);
  const impossible = code === 'EENVELOPE' && responseCode === undefined;
  return {
    permanent: impossible || (refused && command !== undefined && messageCommands.has(command)),
    text: text.replace(/\s+/g, ' ').slice(0, TEXT_LIMIT),
  };
}
