import { registerRequest, type RegisterRequest } from '@lydite/contracts';
import { Button, ErrorSummary, Page, TextField } from '@lydite/ui';
import { Link, useNavigate } from 'react-router-dom';
import { call } from '../call/call.ts';
import { Refusal } from '../form/Refusal.tsx';
import { useRequestForm } from '../form/use-request-form.ts';
import { useApp } from '../shell/app-context.ts';
import { useTitle } from '../shell/use-title.ts';
import { NewPasswordField } from './NewPasswordField.tsx';
import { RolesField } from './RolesField.tsx';

export function Component() {
  const navigate = useNavigate();
  const { app } = useApp();
  useTitle('Register');
  const { field, submit, problems, refusal, isSending } = useRequestForm<RegisterRequest>({
    schema: registerRequest,
    start: { email: '', password: '', name: '', place: '', roles: [app === 'seller' ? 'seller' : 'buyer'] },
    send: async (body) => {
      await call('POST /members', { body });
      await navigate('/register/sent', { state: { email: body.email } });
    },
  });
  const { error: rolesError, id: _, ...roles } = field('roles');

  return (
    <Page shape="narrow">
      <h1>Register</h1>
      <p className="lead">Looking at lots needs no account. Bidding and selling do.</p>
      <ErrorSummary problems={problems} />
      <form onSubmit={submit} noValidate className="fields mt-6 max-w-md">
        <RolesField error={rolesError} input={roles} />
        <TextField {...field('name')} label="Firm, or your own name" autoComplete="organization" />
        <TextField {...field('place')} label="Town" hint="Where you trade from" autoComplete="address-level2" />
        <TextField {...field('email')} label="E-mail" type="email" autoComplete="username" />
        <NewPasswordField {...field('password')} label="Password" />
        <Refusal>{refusal}</Refusal>
        <Button look="primary" type="submit" className="justify-self-start" busy={isSending && 'Sending'}>
          Register
        </Button>
      </form>
      <p className="mt-6">
        Registered before? <Link to="/sign-in">Sign in</Link>
      </p>
    </Page>
  );
}
