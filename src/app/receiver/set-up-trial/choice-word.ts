const words: Readonly<Record<string, string>> = {
  none: $localize`none`,
  fitted: $localize`fitted`,
  above: $localize`above`,
  below: $localize`below`,
  primary: $localize`tuned primary`,
  loop: $localize`tuned loop`,
  widths: $localize`two widths`,
  transformers: $localize`transformers`,
  table: $localize`table`,
  parallel: $localize`parallel`,
  series: $localize`series`,
  crystal: $localize`crystal`,
  mechanical: $localize`mechanical`,
  ceramic: $localize`ceramic`,
  broadcast: $localize`broadcast`,
  beacon: $localize`beacons`,
  marine: $localize`marine`,
  telegraphy: $localize`telegraphy`,
};

/** What can be chosen, in a word. */
export const choiceWord = (choice: string): string => words[choice] ?? choice;
