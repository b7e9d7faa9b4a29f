// CommonJS, since sequelize-cli's configuration and the site both load it.
const mariadb = require("mariadb");

/**
 * The driver, with results Sequelize 6 can work on: it deletes `meta` from them, which connector 3 makes undeletable, so each
 * result is given as a plain copy. Naming the driver here also puts it into the standalone build.
 */
module.exports = {
  ...mariadb,
  createConnection: async (config) => {
    const connection = await mariadb.createConnection(config);
    const query = connection.query.bind(connection);
    connection.query = async (...args) => {
      const result = await query(...args);
      return Array.isArray(result) && result.meta ? Object.assign(result.slice(), { meta: result.meta }) : result;
    };
    return connection;
  },
};
