'use client'
// What a keeper can change about one person.
import { ActionForm } from '@/components/ui/action-form'
import { changeRoleAction, takeOffAction } from '../actions'
import { RoleChoice } from './role-choice'

interface Props {
  rinkId: string
  userId: string
  name: string
}

export function RoleForm({ name, role, ...person }: Props & { role: string }) {
  return (
    <ActionForm action={changeRoleAction} submit="Save" submitLabel={`Save what ${name} is`} look="plain">
      {({ fields }) => (
        <>
          <Which {...person} />
          <RoleChoice key={role} legend={`${name} is`} role={role} error={fields?.role} />
        </>
      )}
    </ActionForm>
  )
}

export function TakeOffForm({ name, ...person }: Props) {
  return (
    <ActionForm
      action={takeOffAction}
      submit="Take off the rink"
      submitLabel={`Take ${name} off the rink`}
      look="plain"
    >
      {() => <Which {...person} />}
    </ActionForm>
  )
}

function Which({ rinkId, userId }: Omit<Props, 'name'>) {
  return (
    <>
      <input type="hidden" name="rinkId" value={rinkId} />
      <input type="hidden" name="userId" value={userId} />
    </>
  )
}
