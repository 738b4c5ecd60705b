import { useState } from 'react';
import { Link } from 'react-router-dom';
import type { CardPaper, OrderLabels } from '#shared/contracts/cards.ts';
import { formatTime } from '#shared/dates/format.ts';
import { actionClasses } from '#web/components/ui/button.tsx';
import { Select } from '#web/components/ui/select.tsx';
import { TextField } from '#web/components/ui/text-field.tsx';
import { paths } from '#web/config/paths.ts';
import { careCardAddress } from '../print-address.ts';

type Props = {
  readonly number: number;
  readonly labels: OrderLabels;
  readonly paper: CardPaper;
};

/** Minutes since midnight of a time field; null while it is empty. */
function minutesOf(time: string): number | null {
  const match = /^(\d{2}):(\d{2})/u.exec(time);
  return match === null ? null : Number(match[1]) * 60 + Number(match[2]);
}

/** The card that goes home with the cake, and the page its code opens. */
export function CareCardChoice({ number, labels, paper: usual }: Props) {
  const [paper, setPaper] = useState<CardPaper>(usual);
  const [time, setTime] = useState(labels.servedAt === null ? '' : formatTime(labels.servedAt));
  return (
    <div className="grid gap-4">
      <h3>Print the care card</h3>
      <div className="flex flex-wrap gap-x-6 gap-y-4">
        <TextField
          label="Cut at"
          optional
          hint="The card then says until when it stays in the fridge."
          type="time"
          value={time}
          onChange={(event) => setTime(event.target.value)}
        />
        <Select
          label="Paper"
          value={paper}
          onChange={(event) => setPaper(event.target.value === 'a5' ? 'a5' : 'half-letter')}
        >
          <option value="half-letter">Half a US Letter</option>
          <option value="a5">A5</option>
        </Select>
      </div>
      <div className="flex flex-wrap items-center gap-x-5 gap-y-3">
        <a
          href={careCardAddress(number, { paper, servedAt: minutesOf(time) })}
          target="_blank"
          rel="noreferrer"
          className={actionClasses('primary', 'normal', false)}
        >
          Open the care card to print
        </a>
        {labels.careCode !== null && (
          <Link to={paths.cakeCare(labels.careCode)} className="link">
            The page its code opens
          </Link>
        )}
      </div>
    </div>
  );
}
