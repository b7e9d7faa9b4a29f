import { setTimeout as pause } from "node:timers/promises";
import { Failure } from "./failure.mjs";

const MOST_IN_A_ROW = 3;
const A_ROW = 60_000;

/**
 * Watches the services and starts again any that ends by itself, on its old port, so that a database that was killed does not
 * take the site with it. One that keeps ending is given up. Never returns.
 * @throws Failure with the end of the log when a service ends a fourth time within a minute.
 */
export function supervise(things, isStopping, print = console.log) {
  const watch = async (thing) => {
    let ends = [];
    for (;;) {
      const { service } = thing;
      const how = await service.exited;
      if (isStopping() || service.stopping) return new Promise(() => {}); // our own stop ends this process when it is through
      ends = [...ends.filter((time) => time > Date.now() - A_ROW), Date.now()];
      if (ends.length > MOST_IN_A_ROW)
        throw new Failure(`${service.name} keeps ending by itself (${how}), so everything was stopped: the end of its log above says why.`, { details: service.tail() });
      print(`${service.name} ended by itself (${how}) and is started again.`);
      await pause(200 * ends.length);
      if (isStopping()) return new Promise(() => {});
      const { service: next, stop } = await thing.again();
      Object.assign(thing, { service: next, stop });
      if (isStopping()) await stop();
    }
  };
  return Promise.race(Object.values(things).map(watch));
}
