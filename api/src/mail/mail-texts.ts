import type { MailKind } from './outgoing-mail.entity.js';

export type MailText = { readonly subject: string; readonly text: string; readonly html: string };

type Wording = {
  readonly subject: string;
  readonly path: string;
  readonly lines: readonly string[];
  readonly button: string;
  readonly after: readonly string[];
};

const WORDINGS: Readonly<Record<MailKind, Wording>> = {
  confirm: {
    subject: 'Confirm your mail address for Harkmoor',
    path: '/account/confirm',
    lines: [
      'Your log is ready, and you can write in it right away. Confirm this address to found a club or invite people.',
    ],
    button: 'Confirm this address',
    after: [
      'The link works once, for 48 hours.',
      'If you did not sign up, do nothing: without this link nobody can use your address to found or invite.',
    ],
  },
  reset: {
    subject: 'Set a new password for Harkmoor',
    path: '/account/reset',
    lines: ['Somebody, we hope you, asked for a new password.'],
    button: 'Set a new password',
    after: [
      'The link works once, for 30 minutes. It signs out every device; what waits there to be sent is kept.',
      'If it was not you, do nothing: your password stays as it is.',
    ],
  },
  'sign-up-known': {
    subject: 'You have a Harkmoor account already',
    path: '/account/reset',
    lines: [
      'Somebody, we hope you, tried to sign up with this address. It has an account already, so nothing was changed.',
      'Sign in with your password. If you do not know it any more, set a new one:',
    ],
    button: 'Set a new password',
    after: ['The link works once, for 30 minutes.', 'If it was not you, do nothing.'],
  },
};

/**
 * The subject is a constant; the person's name stands in the body alone. The token stands behind `#`, which
 * browsers send to no server.
 */
export function composeMail(kind: MailKind, name: string, publicUrl: string, token: string): MailText {
  const { subject, path, lines, button, after } = WORDINGS[kind];
  const link = `${publicUrl}${path}#token=${token}`;
  const greeting = `Hello ${name.replace(/\s+/g, ' ')},`;
  const text = [greeting, ...lines, `${button}:\n${link}`, ...after].join('\n\n');
  const html = [
    '<!doctype html><html lang="en"><body style="font-family:sans-serif;color:#231B14">',
    ...[greeting, ...lines].map((line) => `<p>${escapeHtml(line)}</p>`),
    `<p><a href="${escapeHtml(link)}" style="color:#6B3A7D">${escapeHtml(button)}</a></p>`,
    ...after.map((line) => `<p>${escapeHtml(line)}</p>`),
    '</body></html>',
  ].join('\n');
  return { subject, text: `${text}\n`, html };
}

const ENTITIES: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};

function escapeHtml(text: string): string {
  return text.replace(/[&<>"']/g, (character) => ENTITIES[character]!);
}
