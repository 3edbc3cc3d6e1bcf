import { describe, expect, it } from 'vitest'
import { asComponent, asDf, asP, asPoints, asRange, asShare, asShareWithInterval } from './figures.ts'

const percent = { low: 0, high: 100 }
const narrow = { low: 43, high: 72.1 }

describe('figures on screen', () => {
  it('gives a scale of a hundred points one decimal and a narrower one two', () => {
    expect(asPoints(71.25, percent)).toBe('71.3')
    expect(asPoints(52.355556, narrow)).toBe('52.36')
    expect(asPoints(0.51234, { low: 0, high: 1 })).toBe('0.512')
  })

  it('writes a true minus sign and a dash where there is no figure', () => {
    expect(asPoints(-4, percent)).toBe('−4.0')
    expect(asPoints(null, percent)).toBe('–')
    expect(asRange(-1.5, 29, percent)).toBe('between −1.5 and 29.0')
  })

  it('shows the published variance components of the Machines data with four decimals', () => {
    // Pinheiro & Bates, Machines: worker 22.858444, worker:machine 13.909457, residual 0.924630.
    expect(asComponent(22.858444)).toBe('22.8584')
    expect(asComponent(13.909457)).toBe('13.9095')
    expect(asComponent(0.92463)).toBe('0.9246')
  })

  it('keeps four significant digits of a very small component and says zero as zero', () => {
    expect(asComponent(0.000123456)).toBe('0.0001235')
    expect(asComponent(0)).toBe('0')
  })

  it('writes an agreement coefficient with its interval, and without one where there is none', () => {
    expect(asShareWithInterval({ estimate: 0.784, interval: { low: 0.61, high: 0.88 } })).toBe(
      '0.78, between 0.61 and 0.88',
    )
    expect(asShareWithInterval({ estimate: 0.784, interval: null })).toBe('0.78')
    expect(asShare(-0.02)).toBe('−0.02')
  })

  it('never prints a p-value of nought', () => {
    expect(asP(0.0000001)).toBe('below 0.001')
    expect(asP(0.0507)).toBe('0.051')
  })

  it('writes whole degrees of freedom whole', () => {
    expect(asDf(10)).toBe('10')
    expect(asDf(9.9999999998)).toBe('10')
    expect(asDf(8.523)).toBe('8.52')
  })
})
