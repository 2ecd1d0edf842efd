/** One of a few, as buttons in a row. */
interface ChoiceProps<T extends string> {
  readonly label: string;
  readonly options: readonly { readonly id: T; readonly name: string }[];
  readonly chosen: T;
  readonly onChoose: (id: T) => void;
}

export function Choice<T extends string>(props: ChoiceProps<T>) {
  return (
    <fieldset className="flex flex-wrap items-center gap-2 print:hidden">
      <legend className="float-left mr-2 text-sm text-mute">{props.label}</legend>
      {props.options.map(({ id, name }) => (
        <button
          key={id}
          type="button"
          aria-pressed={id === props.chosen}
          className="control min-h-9 px-3 text-sm aria-pressed:border-brass aria-pressed:bg-brass-soft"
          onClick={() => props.onChoose(id)}
        >
          {name}
        </button>
      ))}
    </fieldset>
  );
}
