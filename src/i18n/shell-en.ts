/** Words of the shell: the work and its state, the list of appraisals, history, settings. */
export const shell = {
  shell: {
    cannotOpen: 'This appraisal could not be opened',
    tryAgain: 'Try again',
    undo: 'Undo',
    redo: 'Redo',
    undoWhat: 'Undo: {{what}}',
    redoWhat: 'Redo: {{what}}',
    example: 'Worked example: the first change makes it an appraisal of yours',
    saved: 'Saved on this device',
    saving: 'Saving…',
    failed: 'Could not be saved: {{why}}',
    retry: 'Try again',
    export: 'Export a file',
    dismiss: 'Close',
    settings: 'Settings',
  },
  store: {
    full: 'This device has no room left. Free some space, or export the appraisal as a file.',
    unavailable:
      'This browser keeps nothing here, as in some private windows. Export the appraisal as a file before you close the page.',
    outdated: 'A newer version of Steelyard is open in another tab. Reload this page.',
    deleted: 'The appraisal was deleted in another tab.',
    failed: 'The device’s store gave no answer. Try again, or export the appraisal as a file.',
  },
  connection: {
    blocked: 'A tab with an older version of Steelyard holds the store: close it to go on.',
    outdated:
      'Another tab put a newer version of Steelyard in use. Changes made here are no longer kept: reload.',
    reload: 'Reload',
  },
  draft: {
    covered:
      'Another tab changed the same thing. Your change stands: “{{label}}”. Undo brings the other back.',
    dropped: 'Your change does not fit any more and was left out: “{{label}}”.',
    unreadable_one: '{{count}} change kept on this device fits no longer and was passed over.',
    unreadable_other: '{{count}} changes kept on this device fit no longer and were passed over.',
  },
  form: {
    required: 'Something has to stand here.',
    noNumber: 'This is not a number.',
    min: 'It must be {{limit}} or more.',
    max: 'It must be {{limit}} or less.',
    above: 'It must be above {{limit}}.',
    whole: 'It must be a whole number.',
  },
  own: {
    title: 'Your appraisals',
    opened: 'Opened {{time}}',
    rename: 'Rename',
    duplicate: 'Duplicate',
    export: 'Export',
    delete: 'Delete',
    deleted: 'Deleted: {{title}}.',
    copyOf: '{{title}} (copy)',
    newTitle: 'New title',
    save: 'Rename',
  },
  begin: {
    title: 'Begin an appraisal of your own',
    lead: 'A template is a small model that runs at once. Its numbers are placeholders, marked as such, for you to replace.',
    templates: {
      empty: {
        name: 'Empty',
        body: 'Begin with the question; the model has one state and no numbers yet.',
      },
      'two-state': {
        name: 'Two states',
        body: 'Alive and dead, with an effect on dying.',
      },
      progressive: {
        name: 'Three states, progressive',
        body: 'Stable, progressed, dead: an illness that gets worse.',
      },
      relapsing: {
        name: 'Remission and relapse',
        body: 'An illness that comes and goes.',
      },
      screening: {
        name: 'Screening, with a test at the start',
        body: 'A short decision tree of who is found, then the years that follow.',
      },
      'acute-chronic': {
        name: 'Acute, then chronic',
        body: 'An illness over within the first cycle, and what it leaves behind.',
      },
    },
  },
  settings: {
    look: 'Language and look',
    person: 'You',
    work: 'Draws',
    samples: 'Draws of a new appraisal',
    samplesHelp: 'Common practice is {{number}} or more. Each appraisal keeps its own number.',
    workers: 'Simulators at work at once',
    workersHelp: 'Results do not depend on it. In force when the page is next opened.',
    workersAuto_one: 'As the device allows ({{count}})',
    workersAuto_other: 'As the device allows ({{count}})',
    storage: 'Storage',
    appraisals_one: '{{count}} appraisal is kept on this device.',
    appraisals_other: '{{count}} appraisals are kept on this device.',
    room: '{{used}} MB in use of about {{all}} MB.',
    kept: {
      granted: 'The browser promises to keep this data.',
      refused:
        'The browser may clear this data when the device runs out of room. Export what matters as a file.',
      unknown: 'This browser does not say whether it keeps data. Export what matters as a file.',
    },
    keep: 'Keep my data',
  },
  keys: {
    title: 'Keys',
    undo: { keys: 'Ctrl or Cmd + Z', does: 'Takes the last change back' },
    redo: { keys: 'Ctrl or Cmd + Shift + Z', does: 'Brings it again' },
    keys: { keys: '?', does: 'Shows these keys, outside a field' },
    poise: { keys: 'Arrow keys', does: 'Move the poise, or a slider, by a step' },
    poiseFar: { keys: 'Page Up, Page Down, Home, End', does: 'Move it further, or to an end' },
    close: { keys: 'Esc', does: 'Closes what lies over the page' },
  },
};
