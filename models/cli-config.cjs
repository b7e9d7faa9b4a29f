const connection = require("./connection.cjs");

// sequelize-cli asks for one entry per NODE_ENV; here the address decides where the tables are, whatever the environment.
const config = { ...connection, use_env_variable: "DATABASE_URL" };
module.exports = { development: config, test: config, production: config };
