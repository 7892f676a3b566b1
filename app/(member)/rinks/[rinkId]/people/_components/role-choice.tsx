'use client'
// Keeper, crew or skater, with what each can do.
import { useState } from 'react'
import { ChoiceField } from '@/components/ui/choice-field'
import { ROLE_CAN, ROLE_NAMES } from '@/lib/words/roles'

const CHOICES = (['crew', 'skater', 'keeper'] as const).map((role) => ({
  value: role,
  label: ROLE_NAMES[role],
  note: `Can ${ROLE_CAN[role]}.`,
}))

export function RoleChoice({ legend, role, error }: { legend: string; role: string; error?: string }) {
  const [chosen, choose] = useState(role)
  return <ChoiceField legend={legend} name="role" choices={CHOICES} value={chosen} onChoose={choose} error={error} />
}
