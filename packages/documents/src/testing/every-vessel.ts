/** A spec with a vessel of every kind by every method that a spec can choose: what documents have to be able to show. */
export const everyVessel = `coldfill: 1
project:
  number: SW-77
  title: Sedge Wharf Works
  client: Sedge Wharf Estates
  location: Tarn Valley
  elevation: 820 ft
  units: US
  codes: { plumbing: UPC 2024, mechanical: IMC 2021 }
systems:
  HWS:
    title: Heating water
    service: heating water
    temperatures: { fill: 50 °F, low: 55 °F, high: 180 °F, average: 170 °F }
    pressure:
      static-height: 42 ft
      top-margin: 4 psi
      relief-valve: 60 psi
      relief-height: 3 ft
      pump-head: 25 ft
      vessel-connection: pump discharge
    contents:
      - { equipment: Boilers B-1 and B-2, volume: 24 gal, count: 2, material: steel }
      - { pipe: copper type L, size: 2 in, length: 640 ft }
      - { estimate: convectors, output: 400 MBH }
      - { volume: 120 gal, note: coils }
    vessels:
      ET-1: { kind: expansion tank, construction: bladder, method: ashrae }
      ET-2: { kind: expansion tank, construction: diaphragm, method: ashrae, precharge: 30 psi, quantity: 2 }
      ET-3: { kind: expansion tank, construction: plain steel, method: ashrae }
      ET-4: { kind: expansion tank, construction: open, method: ashrae }
      ET-5: { kind: expansion tank, method: en 12828 }
      ET-6: { kind: expansion tank, method: din 4807 }
      ET-7: { kind: expansion tank, method: une 100155 }
      ET-8: { kind: expansion tank, construction: diaphragm, method: bs 7074 }
      ET-9: { kind: expansion tank, construction: bladder, method: bs 7074 }
      ET-10: { kind: expansion tank, construction: diaphragm, method: code minimum }
      ET-11: { kind: expansion tank, construction: plain steel, method: code minimum }
      BT-1: { kind: buffer tank, source-minimum: 96 MBH, load-minimum: 10 MBH, run-time: 10 min, temperature-band: 20 °F }
      BT-2: { kind: buffer tank, method: volume per ton, cooling-capacity: 60 ton }
      BT-3: { kind: buffer tank, method: en 303-5, boiler-output: 200 MBH, burn-time: 5 h, heat-load: 120 MBH, boiler-minimum: 80 MBH }
      BT-4: { kind: buffer tank, method: defrost, defrost-energy: 20000 Btu, temperature-band: 10 °F }
      GF-1: { kind: glycol feeder }
      GF-2: { kind: glycol feeder, pump-flow: 2 gpm }
      ADS-1: { kind: air and dirt separator, flow: 100 gpm }
      HS-1: { kind: hydraulic separator, source-flow: 80 gpm, load-flow: 100 gpm }
  GLY:
    title: Preheat glycol
    service: heating water
    fluid: { base: propylene glycol, strength: 40 % vol }
    temperatures: { fill: 50 °F, low: 20 °F, high: 165 °F }
    pressure: { fill: 20 psi, relief-valve: 45 psi }
    contents: [ { volume: 260 gal, note: coils and mains } ]
    vessels:
      GT-1: { kind: expansion tank, method: ashrae }
      GT-2: { kind: expansion tank, method: en 12828 }
      GT-3: { kind: expansion tank, method: une 100155 }
      GT-4: { kind: buffer tank, source-minimum: 96 MBH, load-minimum: 10 MBH, run-time: 10 min, temperature-band: 20 °F }
  DHW:
    title: Domestic hot water
    service: domestic hot water
    temperatures: { cold: 45 °F, storage: 140 °F }
    pressure: { supply: 95 psi, regulator: 60 psi, backflow-preventer: yes, relief-valve: 150 psi }
    contents:
      - { equipment: Heater WH-1, volume: 119 gal }
      - { pipe: copper type L, size: 1 in, length: 210 ft }
    demand:
      building: apartment house
      fixtures: { lavatory: 60, shower: 30 }
      people: 90
      apartments: 35
    vessels:
      TET-1: { kind: thermal expansion tank, method: aspe }
      TET-2: { kind: thermal expansion tank, method: aspe, precharge: 55 psi }
      TET-3: { kind: thermal expansion tank, method: aspe, material: copper }
      TET-4: { kind: thermal expansion tank, method: aspe, material: copper, precharge: 55 psi }
      TET-5: { kind: thermal expansion tank, method: ashrae }
      TET-6: { kind: thermal expansion tank, method: ashrae, precharge: 55 psi }
      TET-7: { kind: thermal expansion tank, method: ashrae, material: copper }
      TET-8: { kind: thermal expansion tank, method: ashrae, material: copper, precharge: 55 psi }
      TET-9: { kind: thermal expansion tank, method: din 4807-5 }
      ST-1: { kind: storage tank, method: ashrae fixture }
      ST-2: { kind: storage tank, method: ashrae fixture, usable-fraction: 75 % }
      ST-3: { kind: storage tank, method: aspe fixture }
      ST-4: { kind: storage tank, method: per person, peak-time: 20 min }
      ST-5: { kind: storage tank, method: per apartment }
      ST-6: { kind: storage tank, method: recovery and storage, recovery: 1.1 gph, storage: 12 gal }
      ST-7: { kind: storage tank, method: din 4708 }
      ST-8: { kind: storage tank, method: din 4708, demand-index: 12 }
  CWB:
    title: Boosted cold water
    service: domestic cold water
    pressure: { cut-in: 40 psi, cut-out: 60 psi }
    vessels:
      PT-1: { kind: pressure tank, drawdown: 20 gal }
      PT-2: { kind: pressure tank, drawdown: 20 gal, precharge: 36 psi }
      PT-3: { kind: pressure tank, pump-flow: 50 gpm, run-time: 1 min }
      PT-4: { kind: pressure tank, pump-flow: 50 gpm, run-time: 1 min, precharge: 36 psi }
      PT-5: { kind: pressure tank, pump-flow: 50 gpm, starts-per-hour: 6 }
      PT-6: { kind: pressure tank, pump-flow: 50 gpm, starts-per-hour: 6, precharge: 36 psi }
      PT-7: { kind: pressure tank, low-demand: 4 gpm, off-time: 5 min }
      PT-8: { kind: pressure tank, low-demand: 4 gpm, off-time: 5 min, precharge: 36 psi }
      PT-9: { kind: pressure tank, method: ten states, pump-flow: 250 gpm }
      BK-1: { kind: break tank, peak-flow: 60 gpm, refill-flow: 20 gpm, holding-time: 30 min }
  SOL:
    title: Solar loop
    service: solar thermal
    temperatures: { low: 5 °C, high: 120 °C }
    pressure: { fill: 2.7 bar, maximum: 5.4 bar }
    contents: [ { volume: 65 L, note: loop } ]
    vessels:
      SE-1: { kind: solar expansion tank, collector-volume: 30 L, piping-above: 10 L }
      SE-2: { kind: solar expansion tank, collector-volume: 30 L, piping-above: 10 L, precharge: 2.4 bar }
      DB-1: { kind: drain-back tank, collector-volume: 10 gal, piping-above: 3 gal }
  LPS:
    title: Steam and condensate
    service: steam
    vessels:
      FT-1: { kind: flash tank, condensate-flow: 5000 lb/h, condensate-pressure: 100 psi, flash-pressure: 5 psi }
      BS-1: { kind: blowdown separator, water-surface: 60 ft2, boiler-pressure: 100 psi }
      BS-2: { kind: blowdown separator, blown-volume: 60 gal, boiler-pressure: 100 psi }
      CR-1: { kind: condensate receiver, steaming-rate: 1980 lb/h }
      CR-2: { kind: condensate receiver, steaming-rate: 3450 lb/h, duty: boiler feed }
      CR-3: { kind: condensate receiver, steaming-rate: 1980 lb/h, duty: condensate }
`
