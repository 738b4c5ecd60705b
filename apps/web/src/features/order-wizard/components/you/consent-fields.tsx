import type { PolicyText } from '#shared/contracts/menu.ts';
import { Checkbox } from '#web/components/ui/checkbox.tsx';
import { paths } from '#web/config/paths.ts';
import { useAnswer } from '../../steps/use-answer.ts';
import { useWizard } from '../../wizard/wizard-context.ts';

/** What the order needs agreement to; showing photos is asked apart and never ticked beforehand. */
export function ConsentFields() {
  const { menu, values } = useWizard();
  const policies = useAnswer('consents.policies');
  const allergyData = useAnswer('consents.allergyData');
  const showPhotos = useAnswer('consents.showPhotos');
  const agreed = menu.policies.filter((it) => it.kind !== 'photo' && it.kind !== 'allergy');
  return (
    <section className="grid gap-4" aria-labelledby="consents-heading">
      <h2 id="consents-heading">What you agree to</h2>
      <Checkbox
        name={policies.name}
        label="I have read and agree to the studio’s policies"
        error={policies.error}
        checked={policies.value}
        onChange={(event) => policies.onValue(event.target.checked)}
      />
      <ul className="grid gap-x-5 pl-9 sm:flex sm:flex-wrap">
        {agreed.map((it) => (
          <PolicyLink key={it.versionId} policy={it} />
        ))}
      </ul>
      {values.day.allergies.length > 0 && (
        <>
          <Checkbox
            name={allergyData.name}
            label="You may keep what I told you about allergies, for this order"
            hint="It is health data: shown only to those who make and hand over your cake, and erased when you ask."
            error={allergyData.error}
            checked={allergyData.value}
            onChange={(event) => allergyData.onValue(event.target.checked)}
          />
          <ul className="pl-9">
            {menu.policies
              .filter((it) => it.kind === 'allergy')
              .map((it) => (
                <PolicyLink key={it.versionId} policy={it} />
              ))}
          </ul>
        </>
      )}
      <div className="border-t border-seam pt-4">
        <Checkbox
          name={showPhotos.name}
          label="You may show photos of my finished cake"
          hint="Only if you like; it changes nothing about your order, and you can take it back."
          checked={showPhotos.value}
          onChange={(event) => showPhotos.onValue(event.target.checked)}
        />
      </div>
    </section>
  );
}

function PolicyLink({ policy }: { readonly policy: PolicyText }) {
  return (
    <li>
      <a
        href={paths.policy(policy.kind)}
        target="_blank"
        rel="noreferrer"
        className="link inline-flex min-h-11 items-center"
      >
        {policy.title}
        <span className="sr-only"> (opens in a new tab)</span>
      </a>
    </li>
  );
}
