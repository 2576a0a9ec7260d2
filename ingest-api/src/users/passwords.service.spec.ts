import { PasswordsService, passwordFault } from './passwords.service.js';

describe('passwords', () => {
  const passwords = new PasswordsService({ mode: 'serve' });
  afterAll(() => passwords.onApplicationShutdown());

  it('are hashed with cost 12 in real use and known again, and no other is', async () => {
    const hash = await passwords.hash('three blue resistors');
    expect(hash).toMatch(/^\$2b\$12\$/);
    expect(await passwords.matches('three blue resistors', hash)).toBe(true);
    expect(await passwords.matches('three blue resistor', hash)).toBe(false);
  });

  it('are compared with something as costly, and refused, where there is no account', async () => {
    expect(await passwords.matches('a password that no account has', null)).toBe(false);
  });

  it('leave the main thread free while they are hashed', async () => {
    let turns = 0;
    const turning = setInterval(() => (turns += 1), 1);
    await passwords.hash('three blue resistors');
    clearInterval(turning);
    expect(turns).toBeGreaterThan(10);
  });

  it('need 12 characters and must fit into what bcrypt reads', () => {
    expect(passwordFault('11 letters!', '/password')).toMatchObject({ code: 'password_short' });
    expect(passwordFault('12 letters!!', '/password')).toBeNull();
    expect(passwordFault('é'.repeat(36), '/password')).toBeNull();
    expect(passwordFault('é'.repeat(37), '/password')).toMatchObject({ code: 'password_long' });
  });
});
