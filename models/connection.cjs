const dialectModule = require("./mariadb-dialect.cjs");

/**
 * How every Sequelize of this project talks to MariaDB: the site's and the migrations'.
 * `initSql` is one string on purpose: Sequelize appends to an array given here at each new connection.
 */
module.exports = {
  dialect: "mariadb",
  dialectModule,
  logging: false,
  dialectOptions: {
    charset: "utf8mb4",
    connectTimeout: 5_000,
    initSql: "SET SESSION innodb_lock_wait_timeout = 5, SESSION wait_timeout = 600",
  },
  define: { charset: "utf8mb4", collate: "utf8mb4_unicode_ci", underscored: true },
};
