import { passwordFault } from './password-rules.js';

describe('a new password', () => {
  it('is taken when it is long and nobody’s favourite', () => {
    expect(passwordFault('correct pony battery', 'ada@weir.example')).toBeNull();
  });

  it('is refused when it stands in the list of common ones, in any case', () => {
    expect(passwordFault('1qaz2wsx3edc', 'ada@weir.example')).toMatch(/everybody tries/);
    expect(passwordFault('LeaveMeAlone', 'ada@weir.example')).toMatch(/everybody tries/);
  });

  it('is refused when it is the e-mail address', () => {
    expect(passwordFault('Ada@Weir.example', 'ada@weir.example')).toMatch(/e-mail address/);
  });

  it('is refused when it is short, or longer than what is compared', () => {
    expect(passwordFault('short', 'ada@weir.example')).toMatch(/At least 12/);
    expect(passwordFault('x'.repeat(73), 'ada@weir.example')).toMatch(/At most 72/);
  });
});
