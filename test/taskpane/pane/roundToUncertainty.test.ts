import { describe, expect, it } from 'vitest';
import { roundToUncertainty } from '../../../taskpane/pane/look/roundToUncertainty';

describe('roundToUncertainty', () => {
  it.each([
    [-44.12345, 0.1234, '−44.12'],
    [45054.3, 123.4, '45050'],
    [45054.3, 12.34, '45054'],
    [2357.6512, 0.00999, '2357.651'],
    [1.23456, 0.0999, '1.23'],
    [0, 0.5, '0.00'],
    [-0.0004, 0.5, '0.00'],
    [-0.00004, 0.5, '0.00'],
    [2.9012e-9, 2.9e-10, '2.90e−9'],
    [-2.9012e-9, 2.9e-10, '−2.90e−9'],
    [2.9e-10, 2.9e-10, '2.9e−10'],
    [0.00023456, 1e-6, '0.0002346'],
  ])('keeps two digits of the uncertainty: %d with %d', (value, uncertainty, text) => {
    expect(roundToUncertainty(value, uncertainty).text).toBe(text);
  });

  it('keeps six digits where no uncertainty is known, and all of them apart', () => {
    expect(roundToUncertainty(-43.987654321)).toEqual({ text: '−43.9877', full: '−43.987654321' });
    expect(roundToUncertainty(2, 0).text).toBe('2');
    expect(roundToUncertainty(2, Number.NaN).text).toBe('2');
  });
});
