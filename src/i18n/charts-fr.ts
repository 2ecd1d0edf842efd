/** Les mots des graphiques. */
export const charts = {
  drawing: 'Tracé en cours…',
  png: 'PNG',
  svg: 'SVG',
  notSaved: 'L’image n’a pas pu être faite. Le tableau et le CSV contiennent les mêmes nombres.',
  firstRows: 'Les {{shown}} premières lignes sur {{total}}\u00A0; le CSV les contient toutes.',
  alt: '{{title}}. Les mêmes nombres sont dans le tableau.',
};
