using Microsoft.EntityFrameworkCore.Migrations;

#nullable disable

namespace Credtrack.Migrations.Sqlite.Migrations
{
    /// <inheritdoc />
    public partial class GrantTexts : Migration
    {
        /// <inheritdoc />
        protected override void Up(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.AddColumn<string>(
                name: "GapSalt",
                table: "Signatures",
                type: "TEXT",
                maxLength: 32,
                nullable: true);

            migrationBuilder.AddColumn<bool>(
                name: "IsOpen",
                table: "Grants",
                type: "INTEGER",
                nullable: true);

            migrationBuilder.AddColumn<string>(
                name: "ReasonSalt",
                table: "Endings",
                type: "TEXT",
                maxLength: 32,
                nullable: false,
                defaultValue: "");

            migrationBuilder.AddColumn<string>(
                name: "ReasonSalt",
                table: "Declines",
                type: "TEXT",
                maxLength: 32,
                nullable: false,
                defaultValue: "");

            // What is proposed or stands already is open too; written by hand, because the tool sees columns alone.
            migrationBuilder.Sql("""
                UPDATE "Grants" SET "IsOpen" = 1
                WHERE NOT EXISTS (SELECT 1 FROM "Declines" WHERE "Declines"."GrantId" = "Grants"."Id") AND NOT EXISTS (SELECT 1 FROM "Endings" WHERE "Endings"."GrantId" = "Grants"."Id")
                """);

            migrationBuilder.CreateIndex(
                name: "IX_Grants_HolderId_ProgrammeId_ApplicationId_IsOpen",
                table: "Grants",
                columns: new[] { "HolderId", "ProgrammeId", "ApplicationId", "IsOpen" },
                unique: true);
        }

        /// <inheritdoc />
        protected override void Down(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.DropIndex(
                name: "IX_Grants_HolderId_ProgrammeId_ApplicationId_IsOpen",
                table: "Grants");

            migrationBuilder.DropColumn(
                name: "GapSalt",
                table: "Signatures");

            migrationBuilder.DropColumn(
                name: "IsOpen",
                table: "Grants");

            migrationBuilder.DropColumn(
                name: "ReasonSalt",
                table: "Endings");

            migrationBuilder.DropColumn(
                name: "ReasonSalt",
                table: "Declines");
        }
    }
}
