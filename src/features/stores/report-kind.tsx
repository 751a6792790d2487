import { CircleHelp, DoorOpen, Droplets, LightbulbOff, Move, PackageMinus, PackageX, ThermometerSun, Snowflake, type LucideIcon } from 'lucide-react';
import { useTranslation } from 'react-i18next';
import { ChoiceCard } from './choice-card';
import { problemKinds, withAnswers, type ProblemKind } from './report-steps';
import { StepHeading } from './step-heading';

const icons: Record<ProblemKind, LucideIcon> = {
  'not-cooling': ThermometerSun,
  'door-or-hinge': DoorOpen,
  leak: Droplets,
  light: LightbulbOff,
  'ice-quality': Snowflake,
  'damaged-bags': PackageX,
  'missing-ice': PackageMinus,
  'move-or-remove': Move,
  other: CircleHelp,
};

interface Props {
  search: URLSearchParams;
  /** How many steps there are. */
  of: number;
}

/** The first tap: what is wrong. */
export function ReportKind({ search, of }: Props) {
  const { t } = useTranslation(['report', 'requests']);
  return (
    <section className="mt-4">
      <p className="text-small text-ink-3">{t('step', { step: 1, of })}</p>
      <StepHeading>{t('kind.question')}</StepHeading>
      <ul className="mt-3 grid gap-2 sm:grid-cols-2">
        {problemKinds.map((kind) => (
          <li key={kind}>
            <ChoiceCard to={withAnswers(search, { kind })} title={t(`requests:kinds.${kind}`)} hint={t(`kind.hints.${kind}`)} Icon={icons[kind]} />
          </li>
        ))}
      </ul>
    </section>
  );
}
