import type { DriverSpecification } from '../../expand/types';
import { CHANNELS } from '../../pose/channelValues';
import { prepareDriver } from '../../pose/driver';
import type { Rule } from '../Rule';
import { rewrite } from '../rewrite';

/** Less than any channel shows: outputs are degrees, scene units or factors. */
const NOTHING = 1e-9;

/** What a driver adds to its channel when its input reads `value`. */
function outputAt(driver: DriverSpecification, value: number): number {
  const channels = new Float64Array(CHANNELS.length);
  prepareDriver({ ...driver, name: driver.id }, Float64Array.of(value), 0)(channels);
  return channels[CHANNELS.indexOf(driver.channel)] ?? 0;
}

/** Everything a rig's users measure is measured at rest; a driver that is not zero there shifts it all. */
export const driverMovesRest: Rule = {
  code: 'driver-moves-rest',
  severity: 'error',
  category: 'motion',
  summary: 'A driver that moves its target while every control is at rest.',
  message: 'At rest "{input}" reads {rest}, where "{id}" adds {output} to {channel} of "{target}".',
  help: 'Let the key at {rest} give 0, or change the default of "{input}".',
  create({ resolved, stage, report }) {
    const byChannel = new Map<string, DriverSpecification[]>();
    return {
      driver(driver) {
        const key = `${driver.target} ${driver.channel}`;
        const others = byChannel.get(key);
        if (others) others.push(driver);
        else byChannel.set(key, [driver]);
      },
      finish() {
        if (byChannel.size === 0) return;
        const controls = new Map(resolved.controls.map((control) => [control.id, control]));
        for (const drivers of byChannel.values()) {
          const [driver] = drivers;
          // Several drivers of one channel may be meant to cancel out.
          if (!driver || drivers.length > 1) continue;
          const { id, control, input, target, channel, outputs, path } = driver;
          const attribute = controls.get(control)?.attributes.find(({ name }) => name === input);
          const rest = attribute?.default ?? (/^s[xyz]$/.test(input) ? 1 : 0);
          const output = outputAt(driver, rest);
          if (!(Math.abs(output) > NOTHING)) continue;
          const rewritings = outputs.map((value, index) => ({
            path: [...path, 'keys', index, 1],
            newText: String(Number((value - output).toPrecision(12))),
          }));
          const rounded = Number(output.toPrecision(6));
          const parameters = { id, input: `${control}.${input}`, rest, output: rounded, channel, target };
          const fix = rewrite(stage.document, `Take ${rounded} from every output`, rewritings);
          report([...path, 'keys'], parameters, fix);
        }
      },
    };
  },
};
