// Finds the rink's place while one types its name, or asks the device where it is. Only with script; coordinates work without.
'use client'
import { useEffect, useState } from 'react'
import useSWR from 'swr'
import { Button } from '@/components/ui/button'
import { TextField } from '@/components/ui/field'
import { placesKey, positionKey } from '@/lib/cache-keys/places'
import { fetchJson } from '@/lib/http/fetch-json'
import type { PlaceSuggestion } from '@/lib/services/places'

interface Found {
  places: PlaceSuggestion[]
}

export type ChosenPlace = Pick<PlaceSuggestion, 'placeName' | 'timeZone' | 'units'> & {
  latitude: string
  longitude: string
}

const PAUSE_MILLIS = 250
/** Four decimals are about ten metres: the yard, and not the chair in the kitchen. */
const DECIMALS = 4

function toChosen({ placeName, timeZone, units, latitudeDeg, longitudeDeg }: PlaceSuggestion): ChosenPlace {
  const text = (degrees: number) => String(Number(degrees.toFixed(DECIMALS)))
  return { placeName, timeZone, units, latitude: text(latitudeDeg), longitude: text(longitudeDeg) }
}

/** What the server knows of a position; undefined when it cannot be asked, for it will work it out again when the form arrives. */
export async function lookUpPosition(latitude: string, longitude: string): Promise<ChosenPlace | undefined> {
  const found = await fetchJson<Found>(positionKey(latitude, longitude)).catch(() => undefined)
  return found?.places[0] && toChosen(found.places[0])
}

/** The text once it has rested. */
function useRested(text: string): string {
  const [rested, setRested] = useState(text)
  useEffect(() => {
    const timer = setTimeout(() => setRested(text), PAUSE_MILLIS)
    return () => clearTimeout(timer)
  }, [text])
  return rested
}

export function PlaceSearch({ onChoose, error }: { onChoose: (place: ChosenPlace) => void; error?: string }) {
  const [typed, setTyped] = useState('')
  const query = useRested(typed.trim())
  const { data, error: failure } = useSWR<Found>(query.length >= 2 ? placesKey(query) : null, fetchJson, {
    keepPreviousData: true,
  })
  const places = query.length >= 2 && typed ? data?.places : undefined
  const choose = (place: PlaceSuggestion) => {
    setTyped('')
    onChoose(toChosen(place))
  }
  return (
    <>
      <TextField
        label="Town or village"
        name="placeSearch"
        type="search"
        autoComplete="off"
        enterKeyHint="search"
        hint="Part of the name will do; add a comma and a province, state or country to narrow it down."
        value={typed}
        error={error}
        onChange={(event) => setTyped(event.target.value)}
        onKeyDown={(event) => {
          if (event.key !== 'Enter') return
          event.preventDefault()
          if (places?.[0]) choose(places[0])
        }}
      />
      <div role="status" className="text-note text-graphite">
        {failure ? 'The list of places cannot be reached. Use your position, or type coordinates below.' : null}
        {!failure && places?.length === 0
          ? 'No such place with a thousand people or more. Try a bigger one nearby.'
          : null}
      </div>
      {places && places.length > 0 ? (
        <ul aria-label="Places found" className="mb-5 border-t border-rule">
          {places.map((place) => (
            <li key={`${place.latitudeDeg} ${place.longitudeDeg}`} className="border-b border-rule">
              <button
                type="button"
                onClick={() => choose(place)}
                className="min-h-touch w-full cursor-pointer py-2 text-left"
              >
                {place.placeName}{' '}
                {place.placeName.endsWith(place.country) ? null : (
                  <span className="text-note text-graphite">{place.country}</span>
                )}
              </button>
            </li>
          ))}
        </ul>
      ) : null}
      <DevicePosition onChoose={onChoose} />
    </>
  )
}

const POSITION_FAULTS: Record<number, string> = {
  1: 'The browser does not tell this page where it is. Allow it in the browser’s settings for this site, or search by name.',
  2: 'The device does not know where it is just now. Search by name, or type coordinates.',
  3: 'Finding the position took too long. Try again under open sky, or search by name.',
}

function DevicePosition({ onChoose }: { onChoose: (place: ChosenPlace) => void }) {
  const [note, setNote] = useState('')
  const [isBusy, setIsBusy] = useState(false)
  const found = async ({ coords }: GeolocationPosition) => {
    const [latitude, longitude] = [coords.latitude.toFixed(DECIMALS), coords.longitude.toFixed(DECIMALS)]
    onChoose(
      (await lookUpPosition(latitude, longitude)) ?? { latitude, longitude, placeName: '', timeZone: '', units: '' },
    )
    setNote('')
    setIsBusy(false)
  }
  const failed = (fault: GeolocationPositionError) => {
    setNote(POSITION_FAULTS[fault.code] ?? fault.message)
    setIsBusy(false)
  }
  const ask = () => {
    if (!('geolocation' in navigator))
      return setNote('This browser knows no position. Search by name, or type coordinates.')
    setIsBusy(true)
    navigator.geolocation.getCurrentPosition(found, failed, { timeout: 15_000, maximumAge: 60_000 })
  }
  return (
    <div className="mb-5">
      <Button onClick={ask} disabled={isBusy}>
        {isBusy ? 'Finding the position' : 'I am at the rink: use this position'}
      </Button>
      <p role="status" className="mt-2 text-note text-rust">
        {note}
      </p>
    </div>
  )
}
