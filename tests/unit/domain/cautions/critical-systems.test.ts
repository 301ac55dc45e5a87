import { describe, expect, it } from 'vitest'
import { isCriticalTopic, needsTwoStamps, topicsOfSystem } from '@/lib/domain/cautions/critical-systems'

describe('critical systems', () => {
  // Codes and meanings: FAA Joint Aircraft System/Component (JASC) Code Table, 2008.
  it.each([
    ['5711', 'Wing Spar', ['structure']],
    ['5313', 'Fuselage Main, Longeron/Stringer', ['structure']],
    ['5510', 'Horizontal Stabilizer Structure', ['structure']],
    ['5520', 'Elevator Structure', ['structure', 'flight-controls']],
    ['5540', 'Rudder Structure', ['structure', 'flight-controls']],
    ['5751', 'Aileron Structure', ['structure', 'flight-controls']],
    ['2710', 'Aileron Control System', ['flight-controls']],
    ['2731', 'Elevator Tab Control System', ['flight-controls']],
    ['2810', 'Fuel Storage', ['fuel']],
    ['2823', 'Fuel Selector/Shutoff Valve', ['fuel']],
    ['7314', 'Engine Fuel Pump', ['fuel', 'powerplant']],
    ['3210', 'Main Landing Gear', ['landing-gear']],
    ['3242', 'Brake', ['brakes', 'landing-gear']],
    ['3244', 'Tire', ['landing-gear']],
    ['2520', 'Passenger Compartment Equipment', ['restraint']],
    ['6110', 'Propeller Assembly', ['powerplant']],
    ['7120', 'Engine Mount Section', ['powerplant']],
    ['8500', 'Engine (Reciprocating)', ['powerplant']],
    ['5346', 'Fuselage, Powerplant Attach Fittings', ['structure', 'powerplant']],
    ['5343', 'Fuselage, Landing Gear Attach Fittings', ['structure', 'landing-gear']],
    ['5210', 'Passenger/Crew Doors', ['doors']],
    ['5610', 'Flight Compartment Windows', ['doors']],
    ['3411', 'Pitot/Static System', ['pitot-static']],
    ['3416', 'Altimeter, Barometric/Encoder', ['pitot-static']],
  ])('%s (%s) stands for %j', (code, _meaning, topics) => {
    expect(topicsOfSystem(code)).toEqual(topics)
  })

  it.each([
    ['1100', 'Placards and Markings'], ['2312', 'VHF Communication System'], ['2460', 'DC Power/Distribution System'],
    ['2500', 'Cabin Equipment/Furnishings'], ['3340', 'Exterior Lighting'], ['3423', 'Magnetic Compass'], ['5350', 'Aerodynamic Fairings'],
  ])('%s (%s) is no critical system', (code) => {
    expect(topicsOfSystem(code)).toEqual([])
  })

  it('reads a code with a dash or a chapter alone, and nothing out of noise', () => {
    expect(topicsOfSystem('28-10')).toEqual(['fuel'])
    expect(topicsOfSystem('27')).toEqual(['flight-controls'])
    for (const noise of ['', 'x', '2', 'none']) expect(topicsOfSystem(noise)).toEqual([])
  })

  it('two stamps are needed as soon as one caution says so', () => {
    expect(needsTwoStamps([{ twoStamps: false }, { twoStamps: true }])).toBe(true)
    expect(needsTwoStamps([{ twoStamps: false }])).toBe(false)
    expect(needsTwoStamps([])).toBe(false)
  })

  it('tells critical topics from those of the workshop', () => {
    expect(isCriticalTopic('restraint')).toBe(true)
    expect(isCriticalTopic('hearing')).toBe(false)
  })
})
