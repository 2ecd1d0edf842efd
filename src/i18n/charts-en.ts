/** Words of the charts' kit. */
export const charts = {
  drawing: 'Drawing…',
  png: 'PNG',
  svg: 'SVG',
  notSaved: 'The picture could not be made. The table and the CSV hold the same numbers.',
  firstRows: 'The first {{shown}} of {{total}} rows; the CSV has all of them.',
  alt: '{{title}}. The same numbers are in the table.',
};
