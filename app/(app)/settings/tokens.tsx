'use client';

import { useState } from 'react';
import { Button, TextButton } from '@/components/ui/button';
import { Field, Select, TextInput } from '@/components/ui/field';
import { Sheet } from '@/components/ui/sheet';
import { Table, Td, Th } from '@/components/ui/table';
import type { TokenSummary } from '@/lib/auth/company-settings';
import { formatInstant } from '@/lib/format';
import { ROLES } from '@/lib/vocabulary';
import { ROLE_NAMES } from '@/lib/wording';
import { addToken, revokeToken } from './actions';
import { Outcome } from './outcome';
import { useFormAction } from './use-form-action';

const Revoke = ({ token }: { token: TokenSummary }) => {
  const { state, submit, busy } = useFormAction(revokeToken);
  const [asked, setAsked] = useState(false);
  return (
    <form onSubmit={submit}>
      <input type="hidden" name="tokenId" value={token.id} />
      <Outcome state={state} />
      {asked ? (
        <TextButton key="yes" type="submit" disabled={busy} className="text-danger">
          Yes, revoke<span className="sr-only"> {token.label}</span>
        </TextButton>
      ) : (
        <TextButton key="ask" onClick={() => setAsked(true)}>
          Revoke<span className="sr-only"> {token.label}</span>
        </TextButton>
      )}
    </form>
  );
};

const NewToken = () => {
  const { state, submit, busy } = useFormAction(addToken);
  const [label, setLabel] = useState('');
  const [role, setRole] = useState('auditor');
  return (
    <form onSubmit={submit} noValidate className="mt-4 flex flex-col gap-3">
      <div className="flex flex-wrap items-start gap-3">
        <Field label="What it is for" error={state.fields.label} className="min-w-44 flex-1">
          <TextInput
            name="label"
            autoComplete="off"
            value={label}
            onChange={(event) => setLabel(event.target.value)}
            placeholder="Monthly export"
          />
        </Field>
        <Field label="Role" error={state.fields.role} className="min-w-40">
          <Select name="role" value={role} onChange={(event) => setRole(event.target.value)}>
            {ROLES.filter((one) => one !== 'technician').map((one) => (
              <option key={one} value={one}>
                {ROLE_NAMES[one]}
              </option>
            ))}
          </Select>
        </Field>
      </div>
      <Button type="submit" disabled={busy} className="self-start">
        Make a token
      </Button>
      <Outcome state={state} />
    </form>
  );
};

/** Programs that may ask the interface, and the tokens with which they do. */
export const Tokens = ({ tokens, timeZone }: { tokens: readonly TokenSummary[]; timeZone: string }) => (
  <Sheet title="Access tokens">
    <p className="max-w-prose text-ink-2">
      With a token a program of yours reads or writes through the interface at <code className="font-mono">/api</code>,
      in the role you give it.
    </p>
    {tokens.length ? (
      <div className="mt-3">
        <Table label="Access tokens">
          <thead>
            <tr>
              <Th>For</Th>
              <Th>Role</Th>
              <Th>Made</Th>
              <Th>
                <span className="sr-only">Revoke</span>
              </Th>
            </tr>
          </thead>
          <tbody>
            {tokens.map((token) => (
              <tr key={token.id}>
                <Th scope="row">{token.label}</Th>
                <Td>{ROLE_NAMES[token.role]}</Td>
                <Td>{formatInstant(token.createdAt, timeZone)}</Td>
                <Td className="text-right">
                  <Revoke token={token} />
                </Td>
              </tr>
            ))}
          </tbody>
        </Table>
      </div>
    ) : null}
    <NewToken />
  </Sheet>
);
