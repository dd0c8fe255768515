using System;
using Microsoft.EntityFrameworkCore.Migrations;

#nullable disable

namespace Credtrack.Migrations.Sqlite.Migrations
{
    /// <inheritdoc />
    public partial class CatalogueEdits : Migration
    {
        /// <inheritdoc />
        protected override void Up(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.AddColumn<DateTime>(
                name: "RetiredAt",
                table: "Applications",
                type: "TEXT",
                nullable: true);

            migrationBuilder.AddColumn<Guid>(
                name: "RetiredById",
                table: "Applications",
                type: "TEXT",
                nullable: true);

            migrationBuilder.CreateIndex(
                name: "IX_Applications_Name",
                table: "Applications",
                column: "Name",
                unique: true,
                filter: "\"RetiredAt\" IS NULL");

            migrationBuilder.CreateIndex(
                name: "IX_Applications_RetiredById",
                table: "Applications",
                column: "RetiredById");

            migrationBuilder.AddForeignKey(
                name: "FK_Applications_People_RetiredById",
                table: "Applications",
                column: "RetiredById",
                principalTable: "People",
                principalColumn: "Id",
                onDelete: ReferentialAction.Restrict);
        }

        /// <inheritdoc />
        protected override void Down(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.DropForeignKey(
                name: "FK_Applications_People_RetiredById",
                table: "Applications");

            migrationBuilder.DropIndex(
                name: "IX_Applications_Name",
                table: "Applications");

            migrationBuilder.DropIndex(
                name: "IX_Applications_RetiredById",
                table: "Applications");

            migrationBuilder.DropColumn(
                name: "RetiredAt",
                table: "Applications");

            migrationBuilder.DropColumn(
                name: "RetiredById",
                table: "Applications");
        }
    }
}
