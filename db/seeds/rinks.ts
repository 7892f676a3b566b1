// The rinks of the demo: invented names at open land around the world, so that it is evening at one of them at any hour.

/** Fields as a person types them into the set-up form (lib/schemas/rinks.ts). */
const USUAL = {
  units: 'metric',
  length: '10',
  width: '10',
  base: 'liner',
  shelter: 'suburban',
  sky: 'edged',
  phase: 'skating',
  iceThickness: '11',
  fillDepth: '10',
  waterKind: 'cold-tap',
  flow: '25',
  waterTemperature: '6',
  layer: '3',
  maxPasses: '3',
  hoursFrom: '17:00',
  hoursTo: '01:00',
  tellAt: '15:30',
  wantsPush: 'on',
  wantsEmail: 'on',
} as const

export const DEMO_RINKS = [
  {
    scenario: 'clear-cold-night',
    fields: {
      ...USUAL,
      creationKey: '6a2f4a0e-3c1b-4a7c-9d55-0f1e2d3c4b01',
      name: 'Birch Lane',
      placeName: 'Upper Ottawa Valley',
      latitude: '45.9',
      longitude: '-77.3',
    },
  },
  {
    scenario: 'clear-cold-night',
    fields: {
      ...USUAL,
      creationKey: '6a2f4a0e-3c1b-4a7c-9d55-0f1e2d3c4b02',
      name: 'Upper Meadow',
      placeName: 'Gudbrandsdalen',
      latitude: '61.3',
      longitude: '10.2',
    },
  },
  {
    scenario: 'clear-cold-night',
    fields: {
      ...USUAL,
      creationKey: '6a2f4a0e-3c1b-4a7c-9d55-0f1e2d3c4b03',
      name: 'School Yard',
      placeName: 'West of Khovd',
      latitude: '48.0',
      longitude: '91.4',
    },
  },
  {
    scenario: 'clear-cold-night',
    fields: {
      ...USUAL,
      creationKey: '6a2f4a0e-3c1b-4a7c-9d55-0f1e2d3c4b04',
      name: 'Spruce Flats',
      placeName: 'Tanana Valley',
      latitude: '64.7',
      longitude: '-148.3',
    },
  },
  {
    scenario: 'thaw-three-days',
    fields: {
      ...USUAL,
      creationKey: '6a2f4a0e-3c1b-4a7c-9d55-0f1e2d3c4b05',
      name: 'Library Green',
      placeName: 'Eastern Townships',
      latitude: '45.3',
      longitude: '-72.1',
    },
  },
  {
    scenario: 'cold-and-cloudy',
    fields: {
      ...USUAL,
      phase: 'waiting',
      iceThickness: '',
      creationKey: '6a2f4a0e-3c1b-4a7c-9d55-0f1e2d3c4b06',
      name: 'New Boards',
      placeName: 'Madawaska Highlands',
      latitude: '45.2',
      longitude: '-77.2',
    },
  },
] as const
