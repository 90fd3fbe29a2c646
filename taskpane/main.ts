import { boot } from './boot/boot';

const element = document.getElementById('pane');
if (element === null) throw new Error('taskpane.html has no element "pane"');
// A failure is shown in the pane and stays visible to the browser's own tools.
void boot(element, () => import(/* webpackChunkName: "pane" */ './pane/mount'));
