import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { compare, exact, exactDecimal, minus, over, plus, times, toNumber } from '@/lib/domain/measurements/exact'
import { convert, toInches, toSi, units, type LinearUnit } from '@/lib/domain/measurements/units'

const names = Object.keys(units).filter((name): name is LinearUnit => name in units)
const said = (value: string, from: LinearUnit, to: LinearUnit): number => toNumber(convert(exactDecimal(value), from, to))
const anExact = fc.tuple(fc.integer({ min: -1e9, max: 1e9 }), fc.integer({ min: 1, max: 1e9 })).map(([n, d]) => exact(n, d))

describe('unit conversions', () => {
  // NIST SP 811 (2008), appendix B.8: conversion factors, exact ones in bold; B.9 for temperatures.
  it.each([
    ['1', 'in', 'mm', 25.4, 0],
    ['1', 'ft', 'm', 0.3048, 0],
    ['0.040', 'in', 'mm', 1.016, 0],
    ['1', 'ft-lb', 'N·m', 1.3558179483314, 1e-13],
    ['1', 'in-lb', 'N·m', 0.1129848, 5e-8],
    ['190', 'in-lb', 'N·m', 21.46712, 1e-5],
    ['1', 'psi', 'kPa', 6.894757, 5e-7],
    ['1500', 'psi', 'kPa', 10342.136, 1e-3],
    ['1', 'ksi', 'MPa', 6.894757, 5e-7],
    ['1', 'inHg', 'kPa', 3.386389, 0],
    ['1', 'bar', 'kPa', 100, 0],
    ['250', '°F', '°C', 121.1111, 1e-4],
    ['-65', '°F', '°C', -53.8889, 1e-4],
  ] as const)('say %s %s in %s as printed', (value, from, to, printed, tolerance) => {
    expect(Math.abs(said(value, from, to) - printed)).toBeLessThanOrEqual(tolerance)
  })

  it('come back to the very same fraction, between any two units of a kind', () => {
    fc.assert(fc.property(anExact, fc.constantFrom(...names), fc.constantFrom(...names), (value, from, to) => {
      fc.pre(units[from].si === units[to].si)
      expect(compare(convert(convert(value, from, to), to, from), value)).toBe(0)
    }))
  })

  it('are refused between kinds', () => {
    expect(() => convert(exact(1), 'in', 'psi')).toThrow('in cannot be said in psi')
  })

  it('give the same number by the short way and the long one', () => {
    fc.assert(fc.property(fc.integer({ min: -1e7, max: 1e7 }), fc.constantFrom(1, 2, 3, 8, 64, 1000, 10_000), fc.constantFrom(...names), (n, d, unit) => {
      const { factor, zero } = units[unit]
      const value = zero ? plus(exact(n, d), zero) : exact(n, d)
      expect(toSi({ n, d }, unit)).toBe(toNumber(times(value, factor)) * (units[unit].si === 'rad' ? Math.PI : 1))
    }))
    expect(toInches({ n: 254, d: 10 }, 'mm')).toBe(1)
  })
})

describe('exact numbers', () => {
  it('add and take away, multiply and divide without loss', () => {
    fc.assert(fc.property(anExact, anExact, (a, b) => {
      expect(compare(minus(plus(a, b), b), a)).toBe(0)
      if (b.n !== 0n) expect(compare(times(over(a, b), b), a)).toBe(0)
    }))
    expect(() => over(exact(1), exact(0))).toThrow(RangeError)
  })

  it('become the double that the same decimal text becomes, however long', () => {
    fc.assert(fc.property(fc.stringMatching(/^\d{1,25}\.\d{1,25}$/), (text) => {
      expect(toNumber(exactDecimal(text))).toBe(Number(text))
    }))
  })
})
