import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { useState } from 'react';
import { usePageContext } from '#renderer/page-context-provider.tsx';
import { PublicFrame } from '#renderer/public-frame.tsx';
import type { SignInPage } from '#shared/contracts/session.ts';
import { DemoAccounts } from './demo-accounts.tsx';
import { SignInForm } from './sign-in-form.tsx';

export function Page() {
  const { next, demoAccounts } = usePageContext().data as SignInPage & { next: string | null };
  const [client] = useState(() => new QueryClient());
  const [values, setValues] = useState({ signIn: '', password: '' });
  return (
    <QueryClientProvider client={client}>
      <PublicFrame current="signIn">
        <div className="grid gap-12 lg:grid-cols-[26rem_1fr]">
          <SignInForm next={next} values={values} onChange={setValues} />
          {demoAccounts.length > 0 && <DemoAccounts accounts={demoAccounts} onUse={setValues} />}
        </div>
      </PublicFrame>
    </QueryClientProvider>
  );
}
