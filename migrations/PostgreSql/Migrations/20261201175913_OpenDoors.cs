using System;
using Microsoft.EntityFrameworkCore.Migrations;

#nullable disable

namespace Credtrack.Migrations.PostgreSql.Migrations
{
    /// <inheritdoc />
    public partial class OpenDoors : Migration
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
                name: "Contact",
                table: "Sites",
                type: "character varying(200)",
                maxLength: 200,
                nullable: true);

            migrationBuilder.AddColumn<int>(
                name: "LateAfterDays",
                table: "Sites",
                type: "integer",
                nullable: false,
                defaultValue: 7);

            migrationBuilder.AddColumn<string>(
                name: "RemovedBecause",
                table: "Pictures",
                type: "character varying(1000)",
                maxLength: 1000,
                nullable: true);

            migrationBuilder.AddColumn<Guid>(
                name: "StandsInForId",
                table: "Memberships",
                type: "uuid",
                nullable: true);

            migrationBuilder.AddColumn<DateTime>(
                name: "TakenBackAt",
                table: "Leaves",
                type: "timestamp with time zone",
                nullable: true);

            migrationBuilder.AddColumn<DateTime>(
                name: "RetiredAt",
                table: "Applications",
                type: "timestamp with time zone",
                nullable: true);

            migrationBuilder.AddColumn<Guid>(
                name: "RetiredById",
                table: "Applications",
                type: "uuid",
                nullable: true);

            migrationBuilder.CreateTable(
                name: "Administrators",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "uuid", nullable: false),
                    SiteId = table.Column<Guid>(type: "uuid", nullable: false),
                    PersonId = table.Column<Guid>(type: "uuid", nullable: false),
                    BeganAt = table.Column<DateTime>(type: "timestamp with time zone", nullable: false),
                    EndedAt = table.Column<DateTime>(type: "timestamp with time zone", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_Administrators", x => x.Id);
                    table.ForeignKey(
                        name: "FK_Administrators_People_PersonId",
                        column: x => x.PersonId,
                        principalTable: "People",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_Administrators_Sites_SiteId",
                        column: x => x.SiteId,
                        principalTable: "Sites",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                });

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
                name: "Invitations",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "uuid", nullable: false),
                    PersonId = table.Column<Guid>(type: "uuid", nullable: false),
                    Kind = table.Column<string>(type: "character varying(40)", maxLength: 40, nullable: false),
                    Digest = table.Column<string>(type: "character varying(64)", maxLength: 64, nullable: false),
                    MadeAt = table.Column<DateTime>(type: "timestamp with time zone", nullable: false),
                    GoodUntil = table.Column<DateTime>(type: "timestamp with time zone", nullable: false),
                    UsedAt = table.Column<DateTime>(type: "timestamp with time zone", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_Invitations", x => x.Id);
                    table.ForeignKey(
                        name: "FK_Invitations_People_PersonId",
                        column: x => x.PersonId,
                        principalTable: "People",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "Sessions",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "uuid", nullable: false),
                    AccountId = table.Column<Guid>(type: "uuid", nullable: false),
                    StartedAt = table.Column<DateTime>(type: "timestamp with time zone", nullable: false),
                    GoodUntil = table.Column<DateTime>(type: "timestamp with time zone", nullable: false),
                    EndedAt = table.Column<DateTime>(type: "timestamp with time zone", nullable: true),
                    Browser = table.Column<string>(type: "character varying(200)", maxLength: 200, nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_Sessions", x => x.Id);
                    table.ForeignKey(
                        name: "FK_Sessions_Accounts_AccountId",
                        column: x => x.AccountId,
                        principalTable: "Accounts",
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
                name: "IX_Memberships_StandsInForId",
                table: "Memberships",
                column: "StandsInForId");

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

            migrationBuilder.CreateIndex(
                name: "IX_Administrators_PersonId",
                table: "Administrators",
                column: "PersonId");

            migrationBuilder.CreateIndex(
                name: "IX_Administrators_SiteId_PersonId_BeganAt",
                table: "Administrators",
                columns: new[] { "SiteId", "PersonId", "BeganAt" },
                unique: true);

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

            migrationBuilder.CreateIndex(
                name: "IX_Invitations_Digest",
                table: "Invitations",
                column: "Digest",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_Invitations_PersonId",
                table: "Invitations",
                column: "PersonId");

            migrationBuilder.CreateIndex(
                name: "IX_Sessions_AccountId",
                table: "Sessions",
                column: "AccountId");

            migrationBuilder.AddForeignKey(
                name: "FK_Applications_People_RetiredById",
                table: "Applications",
                column: "RetiredById",
                principalTable: "People",
                principalColumn: "Id",
                onDelete: ReferentialAction.Restrict);

            migrationBuilder.AddForeignKey(
                name: "FK_Memberships_People_StandsInForId",
                table: "Memberships",
                column: "StandsInForId",
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

            migrationBuilder.DropForeignKey(
                name: "FK_Memberships_People_StandsInForId",
                table: "Memberships");

            migrationBuilder.DropTable(
                name: "Administrators");

            migrationBuilder.DropTable(
                name: "Closings");

            migrationBuilder.DropTable(
                name: "Confirmations");

            migrationBuilder.DropTable(
                name: "Corrections");

            migrationBuilder.DropTable(
                name: "Invitations");

            migrationBuilder.DropTable(
                name: "Sessions");

            migrationBuilder.DropTable(
                name: "FollowUps");

            migrationBuilder.DropIndex(
                name: "IX_Pictures_RemovedAt",
                table: "Pictures");

            migrationBuilder.DropIndex(
                name: "IX_Memberships_StandsInForId",
                table: "Memberships");

            migrationBuilder.DropIndex(
                name: "IX_Applications_Name",
                table: "Applications");

            migrationBuilder.DropIndex(
                name: "IX_Applications_RetiredById",
                table: "Applications");

            migrationBuilder.DropColumn(
                name: "Reason",
                table: "Withdrawals");

            migrationBuilder.DropColumn(
                name: "Contact",
                table: "Sites");

            migrationBuilder.DropColumn(
                name: "LateAfterDays",
                table: "Sites");

            migrationBuilder.DropColumn(
                name: "RemovedBecause",
                table: "Pictures");

            migrationBuilder.DropColumn(
                name: "StandsInForId",
                table: "Memberships");

            migrationBuilder.DropColumn(
                name: "TakenBackAt",
                table: "Leaves");

            migrationBuilder.DropColumn(
                name: "RetiredAt",
                table: "Applications");

            migrationBuilder.DropColumn(
                name: "RetiredById",
                table: "Applications");
        }
    }
}
