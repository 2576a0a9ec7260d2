import { readFailure } from './delivery-failure.js';

const smtpError = (fields: object) => Object.assign(new Error('Message failed'), fields);

describe('readFailure', () => {
  it.each([
    [
      'an unknown recipient',
      { code: 'EENVELOPE', command: 'RCPT TO', responseCode: 550, response: '550 No such user' },
    ],
    [
      'a refused sender',
      { code: 'EENVELOPE', command: 'MAIL FROM', responseCode: 553, response: '553 Not from you' },
    ],
    ['refused content', { code: 'EMESSAGE', command: 'DATA', responseCode: 554, response: '554 Rejected' }],
    ['an address that no mail can have', { code: 'EENVELOPE', command: 'API' }],
  ])('takes %s as final', (_, fields) => {
    expect(readFailure(smtpError(fields)).permanent).toBe(true);
  });

  it.each([
    ['a full mailbox', { code: 'EENVELOPE', command: 'RCPT TO', responseCode: 452, response: '452 Full' }],
    [
      'a refused sign-in, which the settings can mend',
      { code: 'EAUTH', command: 'AUTH PLAIN', responseCode: 535 },
    ],
    ['a server that greets with a refusal', { code: 'EPROTOCOL', command: 'CONN', responseCode: 554 }],
    ['a dead server', { code: 'ECONNREFUSED', command: 'CONN' }],
    ['a fault of our own', {}],
  ])('tries again after %s', (_, fields) => {
    expect(readFailure(smtpError(fields)).permanent).toBe(false);
  });

  it('quotes the server on one line of bearable length', () => {
    const response = `451-Try\r\n451 ${'later '.repeat(200)}`;
    const { text } = readFailure(smtpError({ responseCode: 451, response }));
    expect(text).toMatch(/^451-Try 451 later/);
    expect(text).toHaveLength(300);
  });
});
