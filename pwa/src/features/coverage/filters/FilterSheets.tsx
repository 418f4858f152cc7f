import { Button } from '../../../design/button/Button';
import { Sheet } from '../../../design/sheet/Sheet';
import type { Overview } from '../answers/questions';
import type { CoverageView } from '../view/coverage-view';
import type { ChangeView } from '../view/use-coverage-view';
import { AntennaChoices, MeasureChoices, OperatorChoices, SetupChoices, SubjectChoices } from './choices';
import type { FilterSheet } from './filter-cells';
import { HoursChoices, MonthChoices } from './time-choices';

export type ChoicesProps = {
  readonly view: CoverageView;
  readonly overview: Overview;
  readonly onChange: ChangeView;
};

const TITLES: Readonly<Record<FilterSheet, string>> = {
  subject: 'Frequency',
  measure: 'The map shows',
  antenna: 'Antenna',
  hours: 'Hours, UTC',
  months: 'Dates',
  setup: 'Setup',
  operator: 'Operator',
  more: 'More filters',
};

/** The sheet that is open, if any; each choice shows on the map behind it at once. */
export function FilterSheets(
  props: ChoicesProps & { readonly sheet: FilterSheet | null; readonly onClose: () => void },
) {
  const { sheet, onClose, onChange } = props;
  if (sheet === null) return null;
  const chooseAndClose: ChangeView = (change) => {
    onChange(change);
    onClose();
  };
  const stays = sheet === 'hours' || sheet === 'months' || sheet === 'more';
  return (
    <Sheet
      isOpen
      title={TITLES[sheet]}
      onClose={onClose}
      foot={
        stays ? (
          <Button wide onClick={onClose}>
            Show
          </Button>
        ) : undefined
      }
    >
      <SheetContent {...props} onChange={stays ? onChange : chooseAndClose} sheet={sheet} />
    </Sheet>
  );
}

function SheetContent({ sheet, ...props }: ChoicesProps & { readonly sheet: FilterSheet }) {
  switch (sheet) {
    case 'subject':
      return <SubjectChoices {...props} />;
    case 'measure':
      return <MeasureChoices {...props} />;
    case 'antenna':
      return <AntennaChoices {...props} />;
    case 'hours':
      return <HoursChoices {...props} />;
    case 'months':
      return <MonthChoices {...props} />;
    case 'setup':
      return <SetupChoices {...props} />;
    case 'operator':
      return <OperatorChoices {...props} />;
    case 'more':
      return (
        <>
          <MonthChoices {...props} />
          <SetupChoices {...props} />
          <OperatorChoices {...props} />
        </>
      );
  }
}
