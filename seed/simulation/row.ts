/** A row of the recovery file, cell by cell as text. */
export type SimulatedRow = {
  recorded: string;
  technician: string;
  site: string;
  appliance: string;
  appliance_category: string;
  refrigerant: string;
  nameplate_charge: string;
  start_weight: string;
  end_weight: string;
  recovered_mass: string;
  final_vacuum: string;
  job_type: string;
  cylinder: string;
};

const COLUMNS = [
  'record_ref',
  'recovered_at',
  'technician',
  'site',
  'appliance',
  'appliance_category',
  'refrigerant',
  'nameplate_charge',
  'start_weight',
  'end_weight',
  'recovered_mass',
  'mass_unit',
  'final_vacuum',
  'vacuum_unit',
  'job_type',
  'cylinder',
];

/** The file as an office would export it; no cell of it needs quotes. */
export const recoveryFile = (rows: readonly SimulatedRow[]): string => {
  const lines = rows.map((row, index) =>
    [
      `T-${String(index + 1).padStart(6, '0')}`,
      row.recorded,
      row.technician,
      row.site,
      row.appliance,
      row.appliance_category,
      row.refrigerant,
      row.nameplate_charge,
      row.start_weight,
      row.end_weight,
      row.recovered_mass,
      'lb',
      row.final_vacuum,
      'inhg',
      row.job_type,
      row.cylinder,
    ].join(','),
  );
  return `${[COLUMNS.join(','), ...lines].join('\n')}\n`;
};
