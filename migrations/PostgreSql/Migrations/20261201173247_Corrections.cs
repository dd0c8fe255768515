using System;
using Microsoft.EntityFrameworkCore.Migrations;

#nullable disable

namespace Credtrack.Migrations.PostgreSql.Migrations
{
    /// <inheritdoc />
    public partial class Corrections : Migration
    {
        /// <inheritdoc />
        protected override void Up(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.AddColumn<string>(
                name: "Reason",
                table: "Withdrawals",
                type: "character varying(1000)",
                maxLength: 1000,
                nullable: true);

            migrationBuilder.AddColumn<string>(
                name: "RemovedBecause",
                table: "Pictures",
                type: "character varying(1000)",
                maxLength: 1000,
                nullable: true);

            migrationBuilder.CreateTable(
                name: "Confirmations",
                columns: table => new
                {
                    ScanId = table.Column<Guid>(type: "uuid", nullable: false),
                    Number = table.Column<int>(type: "integer", nullable: false),
                    SupervisorId = table.Column<Guid>(type: "uuid", nullable: false),
                    ApplicationId = table.Column<Guid>(type: "uuid", nullable: false),
                    PerformedAt = table.Column<DateTime>(type: "timestamp with time zone", nullable: false),
                    WasThere = table.Column<bool>(type: "boolean", nullable: false),
                    At = table.Column<DateTime>(type: "timestamp with time zone", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_Confirmations", x => new { x.ScanId, x.Number });
                    table.ForeignKey(
                        name: "FK_Confirmations_People_SupervisorId",
                        column: x => x.SupervisorId,
                        principalTable: "People",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_Confirmations_Scans_ScanId",
                        column: x => x.ScanId,
                        principalTable: "Scans",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "Corrections",
                columns: table => new
                {
                    ReadingId = table.Column<Guid>(type: "uuid", nullable: false),
                    Number = table.Column<int>(type: "integer", nullable: false),
                    At = table.Column<DateTime>(type: "timestamp with time zone", nullable: false),
                    Reason = table.Column<string>(type: "character varying(1000)", maxLength: 1000, nullable: false),
                    Before = table.Column<string>(type: "character varying(20000)", maxLength: 20000, nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_Corrections", x => new { x.ReadingId, x.Number });
                    table.ForeignKey(
                        name: "FK_Corrections_Readings_ReadingId",
                        column: x => x.ReadingId,
                        principalTable: "Readings",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "FollowUps",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "uuid", nullable: false),
                    ScanId = table.Column<Guid>(type: "uuid", nullable: false),
                    ProgrammeId = table.Column<Guid>(type: "uuid", nullable: false),
                    TraineeId = table.Column<Guid>(type: "uuid", nullable: false),
                    OpenedById = table.Column<Guid>(type: "uuid", nullable: false),
                    OpenedAt = table.Column<DateTime>(type: "timestamp with time zone", nullable: false),
                    ReadAt = table.Column<DateTime>(type: "timestamp with time zone", nullable: false),
                    ClosedAt = table.Column<DateTime>(type: "timestamp with time zone", nullable: true),
                    Version = table.Column<int>(type: "integer", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_FollowUps", x => x.Id);
                    table.CheckConstraint("CK_FollowUps_not_ones_own", "\"OpenedById\" <> \"TraineeId\"");
                    table.ForeignKey(
                        name: "FK_FollowUps_People_OpenedById",
                        column: x => x.OpenedById,
                        principalTable: "People",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_FollowUps_People_TraineeId",
                        column: x => x.TraineeId,
                        principalTable: "People",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_FollowUps_Programmes_ProgrammeId",
                        column: x => x.ProgrammeId,
                        principalTable: "Programmes",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_FollowUps_Scans_ScanId",
                        column: x => x.ScanId,
                        principalTable: "Scans",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "Closings",
                columns: table => new
                {
                    FollowUpId = table.Column<Guid>(type: "uuid", nullable: false),
                    TraineeId = table.Column<Guid>(type: "uuid", nullable: false),
                    ById = table.Column<Guid>(type: "uuid", nullable: false),
                    At = table.Column<DateTime>(type: "timestamp with time zone", nullable: false),
                    Told = table.Column<string>(type: "character varying(200)", maxLength: 200, nullable: false),
                    ToldAt = table.Column<DateTime>(type: "timestamp with time zone", nullable: false),
                    How = table.Column<string>(type: "character varying(40)", maxLength: 40, nullable: false),
                    Remark = table.Column<string>(type: "character varying(1000)", maxLength: 1000, nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_Closings", x => x.FollowUpId);
                    table.CheckConstraint("CK_Closings_not_ones_own", "\"ById\" <> \"TraineeId\"");
                    table.ForeignKey(
                        name: "FK_Closings_FollowUps_FollowUpId",
                        column: x => x.FollowUpId,
                        principalTable: "FollowUps",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_Closings_People_ById",
                        column: x => x.ById,
                        principalTable: "People",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_Closings_People_TraineeId",
                        column: x => x.TraineeId,
                        principalTable: "People",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateIndex(
                name: "IX_Pictures_RemovedAt",
                table: "Pictures",
                column: "RemovedAt");

            migrationBuilder.CreateIndex(
                name: "IX_Closings_ById",
                table: "Closings",
                column: "ById");

            migrationBuilder.CreateIndex(
                name: "IX_Closings_TraineeId",
                table: "Closings",
                column: "TraineeId");

            migrationBuilder.CreateIndex(
                name: "IX_Confirmations_SupervisorId",
                table: "Confirmations",
                column: "SupervisorId");

            migrationBuilder.CreateIndex(
                name: "IX_FollowUps_one_open",
                table: "FollowUps",
                column: "ScanId",
                unique: true,
                filter: "\"ClosedAt\" IS NULL");

            migrationBuilder.CreateIndex(
                name: "IX_FollowUps_OpenedById",
                table: "FollowUps",
                column: "OpenedById");

            migrationBuilder.CreateIndex(
                name: "IX_FollowUps_ProgrammeId_ClosedAt",
                table: "FollowUps",
                columns: new[] { "ProgrammeId", "ClosedAt" });

            migrationBuilder.CreateIndex(
                name: "IX_FollowUps_ScanId",
                table: "FollowUps",
                column: "ScanId");

            migrationBuilder.CreateIndex(
                name: "IX_FollowUps_TraineeId",
                table: "FollowUps",
                column: "TraineeId");
        }

        /// <inheritdoc />
        protected override void Down(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.DropTable(
                name: "Closings");

            migrationBuilder.DropTable(
                name: "Confirmations");

            migrationBuilder.DropTable(
                name: "Corrections");

            migrationBuilder.DropTable(
                name: "FollowUps");

            migrationBuilder.DropIndex(
                name: "IX_Pictures_RemovedAt",
                table: "Pictures");

            migrationBuilder.DropColumn(
                name: "Reason",
                table: "Withdrawals");

            migrationBuilder.DropColumn(
                name: "RemovedBecause",
                table: "Pictures");
        }
    }
}
