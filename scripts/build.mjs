/** `npm run build`: the app into dist/, unless it was built from these very sources. */
import { build } from './lib/build.mjs';
import { install } from './lib/install.mjs';

install();
build();
