// How long somebody worked, from what they write. Expected minutes are reckoned on the clock face by hand.
import { describe, expect, it } from 'vitest'
import { minutesBetween, readHours } from '@/lib/domain/builds/minutes-worked'

describe('minutes between start and stop', () => {
  it.each([
    ['19:30', '22:15', 165], ['00:00', '00:01', 1], ['00:00', '23:59', 1439], ['9:05', '10:00', 55],
    // Over midnight: an hour and a half before it and an hour and a quarter after.
    ['22:30', '01:15', 165], ['23:59', '00:00', 1], ['12:00', '11:59', 1439],
  ])('from %s to %s are %i', (start, stop, minutes) => {
    expect(minutesBetween(start, stop)).toBe(minutes)
  })

  it.each([['20:00', '20:00'], ['24:00', '01:00'], ['7', '8'], ['19:60', '20:00'], ['', '10:00'], ['10:00', ''], ['-1:00', '2:00'], ['half past', '9:00']])('from %s to %s there are none', (start, stop) => {
    expect(minutesBetween(start, stop)).toBeNull()
  })
})

describe('hours as people write them', () => {
  it.each([
    ['2.5', 150], ['2,5', 150], ['2', 120], ['0.25', 15], ['2:30', 150], ['2 h 30', 150], ['2h30m', 150], ['2 h 30 min', 150], ['45 min', 45], ['45m', 45], ['3 hours', 180], ['1 hour', 60], [' 1.75 h ', 105], ['24', 1440], ['0:01', 1],
  ])('%s is %i minutes', (text, minutes) => {
    expect(readHours(text)).toBe(minutes)
  })

  it.each(['', '0', '0:00', '24:01', '25', '2:75', '-2', '2.5.1', 'all evening', '1e3', '9999 min', '2 30'])('%s is not understood', (text) => {
    expect(readHours(text)).toBeNull()
  })
})
