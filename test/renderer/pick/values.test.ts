import { describe, expect, it } from 'vitest';
import { changeText, currencySign, figuresText, moneyText, pairText } from '../../../renderer/pick/values.js';

describe('pairText', () => {
  it.each([
    [0.0523598775, 0.0523598775, 'rad', '3.00 / 3.00 deg'],
    [0.09, 0.09, 'm', '90.0 / 90.0 mm'],
    [0.0007, 0.00161, 'm', '0.700 / 1.610 mm'],
    [68.5e6, 103.2e6, 'Pa', '68.5 / 103.2 MPa'],
    [392.699082, 793.4616, 'rad/s', '3750 / 7577 rpm'],
    [900, 117436, 'N·m', '900 / 117436 N·m'],
    [3000, 159000, 'N', '3000 / 159000 N'],
    [6, 55.9, '1', '6.00 / 55.90 '],
    [0, 0.0523598775, 'rad', '0.00 / 3.00 deg'],
    [0, 0, 'N·m', '0 / 0 N·m'],
  ])('sets %d beside %d %s as %j', (demand, capacity, unit, expected) => {
    const { first, second, unit: shown } = pairText(demand, capacity, unit, 'SI');
    expect(`${first} / ${second} ${shown}`).toBe(expected);
    expect(first.split('.')[1]?.length).toBe(second.split('.')[1]?.length);
  });

  it('shows US units where they are asked for', () => {
    expect(pairText(900, 1345, 'N·m', 'US')).toEqual({ first: '7966', second: '11904', unit: 'lbf·in' });
    expect(pairText(68.5e6, 103.2e6, 'Pa', 'US')).toEqual({ first: '9.94', second: '14.97', unit: 'ksi' });
  });
});

describe('changeText', () => {
  it.each([
    [0.09, 'm', '90.0 to 90.9 mm'],
    [0.0523598775, 'rad', '3.00 to 3.03 deg'],
    [139e6, 'Pa', '139 to 140 MPa'],
    [1758, 'N·m', '1758 to 1776 N·m'],
  ])('shows what a hundredth of %d %s changes: %j', (from, unit, expected) => {
    const { first, second, unit: shown } = changeText(from, from * 1.01, unit, 'SI');
    expect(`${first} to ${second} ${shown}`).toBe(expected);
  });
});

describe('figuresText', () => {
  it.each([
    [1.7289, 4, '1.729'],
    [0.77834, 4, '0.7783'],
    [69.8399, 4, '69.84'],
    [12345, 3, '12345'],
    [0.99996, 4, '1.000'],
    [99.96, 3, '100'],
    [0, 3, '0'],
  ])('%d to %d figures is %j', (number, significant, expected) => {
    expect(figuresText(number, significant)).toBe(expected);
  });
});

describe('money', () => {
  it('stands after the sign, after the code, or alone', () => {
    expect(moneyText(15.556, 'EUR')).toBe('€ 15.56');
    expect(moneyText(15, 'CHF')).toBe('CHF 15.00');
    expect(moneyText(15, null)).toBe('15.00');
    expect(currencySign('EUR')).toBe('€');
  });
});
