/** @type {import("sequelize-cli").Migration} */
module.exports = {
  // A new table: nothing is rewritten and nothing is locked, so no ALGORITHM or LOCK applies.
  up: async (db, { CHAR, DATE, JSON, STRING }) => {
    await db.createTable("short_links", {
      id: { type: CHAR(10, true), primaryKey: true, allowNull: false },
      calculator: { type: STRING(40), allowNull: false },
      operation: { type: STRING(40), allowNull: false },
      version: { type: STRING(20), allowNull: false },
      locale: { type: STRING(10), allowNull: false },
      inputs: { type: JSON, allowNull: false },
      answer: { type: JSON, allowNull: false },
      created_at: { type: DATE(3), allowNull: false },
      last_opened_at: { type: DATE(3), allowNull: false },
    }, { charset: "utf8mb4", collate: "utf8mb4_unicode_ci" });
    await db.addIndex("short_links", ["last_opened_at"], { name: "short_links_last_opened_at" });
  },
  down: (db) => db.dropTable("short_links"),
};
