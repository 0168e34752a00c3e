import { Button } from '../_ui/button';
import type { DemoAccount } from './sign-in-form';

interface Props {
  readonly accounts: readonly DemoAccount[];
  readonly onChoose: (account: DemoAccount) => void;
}

/** One button for each role of the demo organisation. */
export function DemoButtons({ accounts, onChoose }: Props) {
  return (
    <fieldset className="border-t border-rule pt-3">
      <legend className="pr-2 text-second text-ink2">Demo: sign in as</legend>
      <div className="grid grid-cols-2 gap-2">
        {accounts.map((account) => (
          <Button key={account.email} onClick={() => onChoose(account)}>
            {account.label}
          </Button>
        ))}
      </div>
    </fieldset>
  );
}
