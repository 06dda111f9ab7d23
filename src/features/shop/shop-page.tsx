import { useState, type FormEvent } from 'react';
import { LIMITS } from '#shared/contracts/limits.ts';
import type { StoredProfile } from '#shared/contracts/profiles.ts';
import { shopChange, type Shop, type ShopChange } from '#shared/contracts/session.ts';
import { checkForm } from '../../lib/check-form.ts';
import { fieldMessagesOf, type FieldMessages } from '../../lib/field-messages.ts';
import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { Choice } from '../../ui/choice.tsx';
import { Notice } from '../../ui/notice.tsx';
import { Section } from '../../ui/section.tsx';
import { Select } from '../../ui/select.tsx';
import { Sheet } from '../../ui/sheet.tsx';
import { TextField } from '../../ui/text-field.tsx';
import { TitleBlock, TitleCell } from '../../ui/title-block.tsx';
import { useFocusOnWrong } from '../../ui/use-focus-on-wrong.ts';
import { useChangeShop } from './api/change-shop.ts';

interface ShopPageProps {
  readonly shop: Shop;
  readonly profiles: readonly StoredProfile[];
  readonly mayManage: boolean;
}

type Entry = Required<ShopChange>;

const FORM = 'shop-settings';

/** Settings of the shop: to edit for the owner, to read for everybody else. */
export function ShopPage({ shop, profiles, mayManage }: ShopPageProps) {
  const saved: Entry = { name: shop.name, unit: shop.unit, paper: shop.paper, defaultProfileId: shop.defaultProfileId };
  const [entry, setEntry] = useState(saved);
  const [wrong, setWrong] = useState<FieldMessages>({});
  const form = useFocusOnWrong(wrong);
  const change = useChangeShop();
  const set = <K extends keyof Entry>(key: K, value: Entry[K]) => setEntry((now) => ({ ...now, [key]: value }));
  const unsaved = (Object.keys(saved) as (keyof Entry)[]).some((key) => entry[key] !== saved[key]);
  const state = change.isPending ? 'saving' : unsaved ? 'not saved yet' : 'saved';

  function submit(event: FormEvent) {
    event.preventDefault();
    const checked = checkForm(shopChange, entry);
    setWrong(checked.ok ? {} : checked.fields);
    if (!checked.ok) return;
    change.mutate(checked.value, {
      onSuccess: ({ name, unit, paper, defaultProfileId }) => setEntry({ name, unit, paper, defaultProfileId }),
      onError: (error) => setWrong(fieldMessagesOf(error)),
    });
  }

  return (
    <Sheet
      title="Shop"
      titleBlock={
        <TitleBlock
          action={
            mayManage ? (
              <Button
                kind="main"
                wide
                type="submit"
                form={FORM}
                disabled={!unsaved}
                busy={change.isPending ? 'Saving' : ''}
              >
                Save the settings
              </Button>
            ) : undefined
          }
          actionNote={mayManage ? undefined : 'Only the owner changes these'}
        >
          <TitleCell label="Shop" main>
            {shop.name}
          </TitleCell>
          <TitleCell label="Page">Settings</TitleCell>
          <TitleCell label="Saved">
            <span role="status">{state}</span>
          </TitleCell>
        </TitleBlock>
      }
    >
      {change.isError && (
        <Notice level="stop" word="Not saved" live>
          {sayError(change.error)}
        </Notice>
      )}
      <form ref={form} id={FORM} onSubmit={submit} noValidate className="max-w-xl">
        <Section heading="Name">
          <TextField
            label="Name of the shop"
            value={entry.name}
            onValue={(value) => set('name', value)}
            error={wrong.name}
            maxLength={LIMITS.nameLength}
            disabled={!mayManage}
            hint="Stands on every setup sheet as the legal owner."
          />
        </Section>
        <Section heading="New frames">
          <Choice
            label="Drawn in"
            options={[
              { value: 'in', label: 'Inches' },
              { value: 'mm', label: 'Millimetres' },
            ]}
            value={entry.unit}
            onValue={(value) => set('unit', value)}
            disabled={!mayManage}
            hint="Frames that exist keep their unit."
          />
        </Section>
        <Section heading="Files">
          <Choice
            label="Paper of setup sheets"
            options={[
              { value: 'A4', label: 'A4' },
              { value: 'Letter', label: 'US Letter' },
            ]}
            value={entry.paper}
            onValue={(value) => set('paper', value)}
            disabled={!mayManage}
          />
          <Select
            label="File profile unless another is chosen"
            layout="stack"
            options={profiles.map(({ id, profile }) => ({ value: id, label: profile.name }))}
            value={entry.defaultProfileId}
            onValue={(value) => set('defaultProfileId', value)}
            error={wrong.defaultProfileId}
            disabled={!mayManage}
          />
        </Section>
      </form>
    </Sheet>
  );
}
