using System;
using Microsoft.EntityFrameworkCore.Migrations;

#nullable disable

namespace Credtrack.Migrations.SqlServer.Migrations
{
    /// <inheritdoc />
    public partial class Imports : Migration
    {
        /// <inheritdoc />
        protected override void Up(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.AddColumn<bool>(
                name: "IsElsewhere",
                table: "Readings",
                type: "bit",
                nullable: false,
                defaultValue: false);

            migrationBuilder.CreateTable(
                name: "Imports",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "uniqueidentifier", nullable: false),
                    ProgrammeId = table.Column<Guid>(type: "uniqueidentifier", nullable: false),
                    ById = table.Column<Guid>(type: "uniqueidentifier", nullable: false),
                    FileName = table.Column<string>(type: "nvarchar(200)", maxLength: 200, nullable: false),
                    At = table.Column<DateTime>(type: "datetime2", nullable: false),
                    Mapping = table.Column<string>(type: "nvarchar(max)", maxLength: 200000, nullable: true),
                    StagedAt = table.Column<DateTime>(type: "datetime2", nullable: true),
                    Version = table.Column<int>(type: "int", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_Imports", x => x.Id);
                    table.ForeignKey(
                        name: "FK_Imports_People_ById",
                        column: x => x.ById,
                        principalTable: "People",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_Imports_Programmes_ProgrammeId",
                        column: x => x.ProgrammeId,
                        principalTable: "Programmes",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "ImportedRows",
                columns: table => new
                {
                    ScanId = table.Column<Guid>(type: "uniqueidentifier", nullable: false),
                    ImportId = table.Column<Guid>(type: "uniqueidentifier", nullable: false),
                    ProgrammeId = table.Column<Guid>(type: "uniqueidentifier", nullable: false),
                    TraineeId = table.Column<Guid>(type: "uniqueidentifier", nullable: false),
                    AttestedById = table.Column<Guid>(type: "uniqueidentifier", nullable: false),
                    Source = table.Column<string>(type: "nvarchar(100)", maxLength: 100, nullable: false),
                    Key = table.Column<string>(type: "nvarchar(64)", maxLength: 64, nullable: true),
                    Line = table.Column<int>(type: "int", nullable: false),
                    Supervision = table.Column<string>(type: "nvarchar(40)", maxLength: 40, nullable: false),
                    IsRead = table.Column<bool>(type: "bit", nullable: false),
                    OutcomeAt = table.Column<DateTime>(type: "datetime2", nullable: true),
                    OutcomeResult = table.Column<string>(type: "nvarchar(40)", maxLength: 40, nullable: true),
                    Assumed = table.Column<string>(type: "nvarchar(120)", maxLength: 120, nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_ImportedRows", x => x.ScanId);
                    table.CheckConstraint("CK_ImportedRows_not_ones_own", "\"AttestedById\" <> \"TraineeId\"");
                    table.ForeignKey(
                        name: "FK_ImportedRows_Imports_ImportId",
                        column: x => x.ImportId,
                        principalTable: "Imports",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_ImportedRows_People_AttestedById",
                        column: x => x.AttestedById,
                        principalTable: "People",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_ImportedRows_Scans_ScanId",
                        column: x => x.ScanId,
                        principalTable: "Scans",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "ImportFiles",
                columns: table => new
                {
                    ImportId = table.Column<Guid>(type: "uniqueidentifier", nullable: false),
                    Content = table.Column<byte[]>(type: "varbinary(max)", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_ImportFiles", x => x.ImportId);
                    table.ForeignKey(
                        name: "FK_ImportFiles_Imports_ImportId",
                        column: x => x.ImportId,
                        principalTable: "Imports",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "ImportSteps",
                columns: table => new
                {
                    ImportId = table.Column<Guid>(type: "uniqueidentifier", nullable: false),
                    Kind = table.Column<string>(type: "nvarchar(40)", maxLength: 40, nullable: false),
                    ById = table.Column<Guid>(type: "uniqueidentifier", nullable: false),
                    At = table.Column<DateTime>(type: "datetime2", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_ImportSteps", x => new { x.ImportId, x.Kind });
                    table.ForeignKey(
                        name: "FK_ImportSteps_Imports_ImportId",
                        column: x => x.ImportId,
                        principalTable: "Imports",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_ImportSteps_People_ById",
                        column: x => x.ById,
                        principalTable: "People",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateIndex(
                name: "IX_ImportedRows_AttestedById",
                table: "ImportedRows",
                column: "AttestedById");

            migrationBuilder.CreateIndex(
                name: "IX_ImportedRows_ImportId_Line",
                table: "ImportedRows",
                columns: new[] { "ImportId", "Line" },
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_ImportedRows_ProgrammeId_Key",
                table: "ImportedRows",
                columns: new[] { "ProgrammeId", "Key" },
                unique: true,
                filter: "[Key] IS NOT NULL");

            migrationBuilder.CreateIndex(
                name: "IX_Imports_ById",
                table: "Imports",
                column: "ById");

            migrationBuilder.CreateIndex(
                name: "IX_Imports_ProgrammeId_At",
                table: "Imports",
                columns: new[] { "ProgrammeId", "At" });

            migrationBuilder.CreateIndex(
                name: "IX_ImportSteps_ById",
                table: "ImportSteps",
                column: "ById");
        }

        /// <inheritdoc />
        protected override void Down(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.DropTable(
                name: "ImportedRows");

            migrationBuilder.DropTable(
                name: "ImportFiles");

            migrationBuilder.DropTable(
                name: "ImportSteps");

            migrationBuilder.DropTable(
                name: "Imports");

            migrationBuilder.DropColumn(
                name: "IsElsewhere",
                table: "Readings");
        }
    }
}
