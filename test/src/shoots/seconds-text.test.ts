import { secondsFromText, textFromSeconds } from '../../../src/app/shoots/seconds-text';

// How photographers write exposures: common practice, no source.

it.each([
  ['1/50', 0.02],
  ['1/50 s', 0.02],
  ['20', 20],
  ['2,5', 2.5],
])('reads %s as seconds', (text, seconds) => {
  expect(secondsFromText(text)).toBe(seconds);
});

it('reads nothing as not known', () => {
  expect(secondsFromText('  ')).toBeNull();
});

it.each(['soon', '0', '-1', '1/0', '90000', '1//50'])('refuses %s', text => {
  expect(secondsFromText(text)).toBeUndefined();
});

it('writes short exposures as fractions and long ones as decimals', () => {
  expect(textFromSeconds(0.02)).toBe('1/50');
  expect(textFromSeconds(1.5)).toBe('1.5');
  expect(textFromSeconds(null)).toBe('');
});
