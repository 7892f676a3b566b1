// Where the rink is: found by name or position, or typed as coordinates; the zone of its clock follows.
'use client'
import { useState } from 'react'
import { ChoiceField } from '@/components/ui/choice-field'
import { Disclosure } from '@/components/ui/disclosure'
import { TextField } from '@/components/ui/field'
import { useHydrated } from '@/components/hooks/use-hydrated'
import { lookUpPosition, PlaceSearch, type ChosenPlace } from './place-search'
import type { RinkForm } from './use-rink-form'

interface Props {
  form: RinkForm
  /** Settings ask apart whose clock counts. */
  asksWhoseClock?: boolean
}

export function PlaceFields({ form, asksWhoseClock }: Props) {
  const isHydrated = useHydrated()
  const { latitude, longitude } = form.values
  const choose = ({ units, ...place }: ChosenPlace) => {
    form.set(movedTo(form, place))
    form.suggestUnits(units)
  }
  const isMissing = !latitude || !longitude
  const fault = form.error('latitude') ?? form.error('longitude')
  const isFaulty = Boolean(fault ?? form.error('placeName') ?? form.error('timeZone'))
  return (
    <>
      {isHydrated ? <PlaceSearch onChoose={choose} error={isMissing ? fault : undefined} /> : null}
      {isHydrated && !isMissing ? <ChosenLine form={form} asksWhoseClock={asksWhoseClock} /> : null}
      <noscript>
        <p className="mb-3">Search needs script. Open the coordinates below and type where the rink is.</p>
      </noscript>
      <Disclosure
        summary={asksWhoseClock ? 'Coordinates' : 'Coordinates and time zone'}
        className="mb-5"
        open={isFaulty && !(isHydrated && isMissing)}
      >
        <Coordinates form={form} asksWhoseClock={asksWhoseClock} />
      </Disclosure>
    </>
  )
}

/** A clock that somebody chose stays, wherever the rink is moved. */
function movedTo(form: RinkForm, { timeZone, ...place }: Omit<ChosenPlace, 'units'>) {
  return form.values.zoneBy === 'keeper' ? place : { ...place, timeZone }
}

function ChosenLine({ form, asksWhoseClock }: Props) {
  const { placeName, latitude, longitude, timeZone } = form.values
  return (
    <p role="status" className="mb-3 border-l-[3px] border-hose pl-3.5">
      <span className="font-medium">{placeName || 'This position'}</span>
      <span className="block text-note text-graphite">
        {latitude}°, {longitude}°{timeZone && !asksWhoseClock ? `; clock of ${timeZone}` : ''}
      </span>
    </p>
  )
}

/** Typing another position by hand moves name and zone along; both may then be changed. */
function Coordinates({ form, asksWhoseClock }: Props) {
  const { latitude = '', longitude = '' } = form.values
  const [lookedUp, setLookedUp] = useState(`${latitude} ${longitude}`)
  const follow = async () => {
    const position = `${latitude} ${longitude}`
    if (!latitude || !longitude || position === lookedUp) return
    setLookedUp(position)
    const place = await lookUpPosition(latitude, longitude)
    if (place) form.set(movedTo(form, { placeName: place.placeName, timeZone: place.timeZone, latitude, longitude }))
  }
  return (
    <>
      <div className="grid grid-cols-2 gap-4">
        <TextField
          label="Latitude"
          hint="North is positive."
          {...form.text('latitude')}
          onBlur={follow}
          autoComplete="off"
        />
        <TextField
          label="Longitude"
          hint="West is negative."
          {...form.text('longitude')}
          onBlur={follow}
          autoComplete="off"
        />
      </div>
      <TextField
        label="Name of the place"
        hint="If empty, we take the nearest town."
        maxLength={120}
        {...form.text('placeName')}
      />
      {asksWhoseClock ? null : <ZoneField form={form} hint="If empty, it follows from the place." />}
    </>
  )
}

const CLOCK_CHOICES = [
  { value: 'place', label: 'The place’s own', note: 'It follows when the rink is moved.' },
  {
    value: 'keeper',
    label: 'Another, that you choose',
    note: 'It stays, also when the rink is moved across a border.',
  },
]

/** Whose clock counts at the rink. */
export function ClockFields({ form }: { form: RinkForm }) {
  const isHydrated = useHydrated()
  return (
    <>
      <ChoiceField legend="Which clock does the rink go by?" choices={CLOCK_CHOICES} {...form.choice('zoneBy')} />
      <div hidden={isHydrated && form.values.zoneBy !== 'keeper'}>
        <ZoneField form={form} hint="By the name of its city, like America/Toronto." />
      </div>
    </>
  )
}

/** Whoever types here has chosen. */
function ZoneField({ form, hint }: { form: RinkForm; hint: string }) {
  const onChange = (event: { target: { value: string } }) => {
    const timeZone = event.target.value
    form.set({ timeZone, zoneBy: timeZone.trim() ? 'keeper' : 'place' })
  }
  return (
    <>
      <TextField
        label="Time zone"
        hint={hint}
        list="time-zones"
        autoComplete="off"
        spellCheck={false}
        {...form.text('timeZone')}
        onChange={onChange}
      />
      <TimeZones />
    </>
  )
}

/** Drawn by the browser from its own list: 18 kB that need not travel. */
function TimeZones() {
  const isHydrated = useHydrated()
  if (!isHydrated) return null
  return (
    <datalist id="time-zones">
      {Intl.supportedValuesOf('timeZone').map((zone) => (
        <option key={zone} value={zone} />
      ))}
    </datalist>
  )
}
