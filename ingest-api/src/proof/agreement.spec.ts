import { agreementWithin, agreementWithPrinted } from './agreement.js';

const FINE = { rel: 1e-15 };

describe('agreement with a printed figure', () => {
  it.each([
    ['0.2553', 0.255288519878274, { dp: 4 }, 0.5, 4, 4],
    ['0.2554', 0.255288519878274, { dp: 4 }, 0.5, 3, 4],
    ['2.92', 2.9207816, { dp: 2 }, 0.5, 3, 3],
    ['93', 92.483, { dp: 0 }, 1, 2, 2],
    ['93', 92.483, { dp: 0 }, 0.5, 1, 2],
    ['1.23456', 1.234561, { sig: 6 }, 0.5, 6, 6],
    ['-0.930', -0.9304296, { dp: 3 }, 0.5, 3, 3],
    ['0.00009', 0.0000884172, { dp: 5 }, 0.5, 1, 1],
    ['0.0', 0.00001, { dp: 4 }, 0.5, 4, 4],
    ['0.0', 0.0002, { dp: 4 }, 0.5, 3, 4],
  ])(
    '%s against %p, %p, within %p units: %p of %p',
    (printed, computed, digits, units, agreeing, required) => {
      expect(agreementWithPrinted(printed, computed, digits, units, FINE)).toEqual({
        agreeingDigits: agreeing,
        requiredDigits: required,
      });
    },
  );

  it('asks for the tolerance where double precision cannot reach the printed digits', () => {
    const certified = '-0.262323073774029';
    expect(agreementWithPrinted(certified, -0.262323073774, { sig: 15 }, 1, { rel: 1e-11 })).toEqual({
      agreeingDigits: 12,
      requiredDigits: 11,
    });
  });

  it('asks for all digits of an exact number', () => {
    expect(agreementWithPrinted('34', 34, { exact: true }, 1, FINE)).toEqual({
      agreeingDigits: 15,
      requiredDigits: 15,
    });
    expect(agreementWithPrinted('34', 34.0000001, { exact: true }, 1, FINE).agreeingDigits).toBe(8);
  });
});

describe('agreement within a tolerance', () => {
  it('counts the digits of the relative deviation', () => {
    expect(agreementWithin('200', 200.0002, { rel: 1e-5 })).toEqual({ agreeingDigits: 6, requiredDigits: 5 });
  });

  it('counts the decimals of an absolute one', () => {
    expect(agreementWithin('200', 200.0002, { abs: 1e-5 })).toEqual({ agreeingDigits: 3, requiredDigits: 5 });
  });

  it('takes what is no number for no agreement', () => {
    expect(agreementWithin('1', NaN, { rel: 1e-5 }).agreeingDigits).toBe(0);
    expect(agreementWithin('1', Infinity, { rel: 1e-5 }).agreeingDigits).toBe(0);
    expect(agreementWithPrinted('1', NaN, { dp: 2 }, 0.5, FINE).agreeingDigits).toBe(0);
  });
});
