import { Button, Field, Input, ProgressBar } from '@fluentui/react-components';
import { useLook } from '../look/useLook';
import { Notice } from '../look/Notice';
import type { FitDataState } from './useFitData';

/** Where the data stand: the selection, or ranges as typed. */
export function DataSource({ source }: { readonly source: FitDataState }) {
  const look = useLook();
  const { text, progress, failure, changed } = source;
  return (
    <form
      className={look.stack}
      onSubmit={(event) => {
        event.preventDefault();
        void source.read();
      }}
    >
      <Field label="Data" hint="Two columns or more, header row included, as Data!A1:B20">
        <Input
          className={look.narrow}
          input={{ style: { minWidth: 0, width: '100%' }, spellCheck: false, autoComplete: 'off' }}
          value={text}
          onChange={(_, data) => source.setText(data.value)}
        />
      </Field>
      <div className={look.row}>
        <Button type="button" appearance="primary" onClick={() => void source.takeSelection()}>
          Use selection
        </Button>
        <Button type="submit">Fit these cells</Button>
      </div>
      {progress !== undefined && (
        <div className={look.row}>
          <ProgressBar className={look.narrow} value={progress} aria-label="Reading cells" />
          <Button type="button" size="small" onClick={source.cancel}>
            Stop reading
          </Button>
        </div>
      )}
      {failure !== undefined && <Notice tone="error">{failure}</Notice>}
      {changed && failure === undefined && (
        <div role="status">
          <Notice tone="caution">
            <span>Cells of these data have changed since they were read.</span>
            <Button type="submit" size="small">
              Fit again
            </Button>
          </Notice>
        </div>
      )}
    </form>
  );
}
