import { FormControl, FormGroup } from '@angular/forms';
import * as z from 'zod';

import type { Problem } from '../../../../shared/contracts/problem';
import { needed } from './form-issues';
import { Submission } from './submission';

const schema = z.object({
  name: z.string(),
  range: z
    .object({ low: z.number(), high: z.number() })
    .refine(({ low, high }) => high > low, { path: ['high'], error: 'Must end higher.' }),
});
const valid = { name: 'A', range: { low: 1, high: 2 } };

function arrange(problem?: Partial<Problem>) {
  const form = new FormGroup({
    name: new FormControl('', needed('Give a name.')),
    range: new FormGroup({ low: new FormControl(5), high: new FormControl(2) }),
  });
  const toProblem = () => ({ type: 'x', title: 'No.', status: 400, instance: '', ...problem });
  return { form, submission: new Submission(form, schema, toProblem) };
}

describe('a submission', () => {
  it('sends nothing while something is wrong, and says all of it at once', async () => {
    const { form, submission } = arrange();
    const call = vi.fn();

    await submission.send(form.getRawValue(), call);

    expect(call).not.toHaveBeenCalled();
    expect(submission.issues()).toEqual([
      { path: 'name', message: 'Give a name.' },
      { path: 'range.high', message: 'Must end higher.' },
    ]);
  });

  it('puts each message on its field until the field is changed', async () => {
    const { form, submission } = arrange();
    await submission.send(form.getRawValue(), vi.fn());
    const high = form.controls.range.controls.high;

    expect(high.errors).toEqual({ problem: 'Must end higher.' });
    high.setValue(9);
    expect(high.errors).toBeNull();
  });

  it('forgets a message that was put right in another field', async () => {
    const { form, submission } = arrange();
    await submission.send(form.getRawValue(), vi.fn());
    form.patchValue({ name: 'A', range: { low: 1 } });
    const call = vi.fn().mockResolvedValue('kept');

    expect(await submission.send(form.getRawValue(), call)).toBe('kept');
    expect(submission.issues()).toEqual([]);
  });

  it('shows what the server objects to on the fields it names', async () => {
    const issues = [{ path: 'range.low', message: 'Too low.' }];
    const { form, submission } = arrange({ issues });

    await submission.send(valid, () => Promise.reject(new Error('refused')));

    expect(submission.issues()).toEqual([{ path: 'name', message: 'Give a name.' }]);
    form.setValue(valid);
    await submission.send(valid, () => Promise.reject(new Error('refused')));
    expect(submission.issues()).toEqual(issues);
    expect(form.controls.range.controls.low.errors).toEqual({ problem: 'Too low.' });
  });

  it('says as a whole what names no field', async () => {
    const { form, submission } = arrange({ title: 'Try again in a minute.' });
    form.setValue(valid);

    await submission.send(valid, () => Promise.reject(new Error('refused')));

    expect(submission.issues()).toEqual([{ path: '', message: 'Try again in a minute.' }]);
  });

  it('does not send twice at once', async () => {
    const { form, submission } = arrange();
    form.setValue(valid);
    const call = vi.fn().mockResolvedValue(1);

    const [first, second] = await Promise.all([
      submission.send(valid, call),
      submission.send(valid, call),
    ]);

    expect([first, second]).toEqual([1, undefined]);
    expect(call).toHaveBeenCalledOnce();
  });
});
