/** A page with nothing but the browser's host, for tests of it alone. */
import { chooseHost } from '../../../renderer/host/chooseHost.ts';

Reflect.set(window, 'hostUnderTest', chooseHost());
