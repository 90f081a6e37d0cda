using System;
using Microsoft.EntityFrameworkCore.Migrations;

#nullable disable

namespace WaterMix.Workspace.Storage.Migrations
{
    /// <inheritdoc />
    internal sealed partial class Initial : Migration
    {
        /// <inheritdoc />
        protected override void Up(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.CreateTable(
                name: "studies",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    Name = table.Column<string>(type: "TEXT", maxLength: 200, nullable: false),
                    Created = table.Column<DateTime>(type: "TEXT", nullable: false),
                    LastChange = table.Column<DateTime>(type: "TEXT", nullable: false),
                    Deleted = table.Column<DateTime>(type: "TEXT", nullable: true),
                    Draft = table.Column<string>(type: "TEXT", nullable: false),
                    Revision = table.Column<long>(type: "INTEGER", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_studies", x => x.Id);
                });

            migrationBuilder.CreateTable(
                name: "upload_files",
                columns: table => new
                {
                    UploadId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Number = table.Column<int>(type: "INTEGER", nullable: false),
                    Name = table.Column<string>(type: "TEXT", nullable: false),
                    Bytes = table.Column<long>(type: "INTEGER", nullable: false),
                    Received = table.Column<DateTime>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_upload_files", x => new { x.UploadId, x.Number });
                });

            migrationBuilder.CreateTable(
                name: "cruises",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    StudyId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Position = table.Column<int>(type: "INTEGER", nullable: false),
                    Name = table.Column<string>(type: "TEXT", maxLength: 200, nullable: false),
                    SamplesHash = table.Column<string>(type: "TEXT", nullable: false),
                    SampleCount = table.Column<long>(type: "INTEGER", nullable: false),
                    Upload = table.Column<Guid>(type: "TEXT", nullable: false),
                    Report = table.Column<string>(type: "TEXT", nullable: false),
                    Reading = table.Column<string>(type: "TEXT", nullable: false),
                    OtherSamplesHash = table.Column<string>(type: "TEXT", nullable: true),
                    MeasurementSd = table.Column<string>(type: "TEXT", nullable: true),
                    Removed = table.Column<DateTime>(type: "TEXT", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_cruises", x => x.Id);
                    table.ForeignKey(
                        name: "FK_cruises_studies_StudyId",
                        column: x => x.StudyId,
                        principalTable: "studies",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "runs",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    StudyId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Name = table.Column<string>(type: "TEXT", maxLength: 200, nullable: false),
                    Started = table.Column<DateTime>(type: "TEXT", nullable: false),
                    State = table.Column<string>(type: "TEXT", maxLength: 20, nullable: false),
                    Done = table.Column<long>(type: "INTEGER", nullable: false),
                    Total = table.Column<long>(type: "INTEGER", nullable: false),
                    Model = table.Column<string>(type: "TEXT", nullable: false),
                    ModelHash = table.Column<string>(type: "TEXT", nullable: false),
                    Statuses = table.Column<string>(type: "TEXT", nullable: true),
                    Problem = table.Column<string>(type: "TEXT", nullable: true),
                    Folder = table.Column<Guid>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_runs", x => x.Id);
                    table.ForeignKey(
                        name: "FK_runs_studies_StudyId",
                        column: x => x.StudyId,
                        principalTable: "studies",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "chunks",
                columns: table => new
                {
                    RunId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Number = table.Column<int>(type: "INTEGER", nullable: false),
                    Cruise = table.Column<int>(type: "INTEGER", nullable: false),
                    FirstRow = table.Column<int>(type: "INTEGER", nullable: false),
                    RowCount = table.Column<int>(type: "INTEGER", nullable: false),
                    IsDone = table.Column<bool>(type: "INTEGER", nullable: false),
                    Usable = table.Column<string>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_chunks", x => new { x.RunId, x.Number });
                    table.ForeignKey(
                        name: "FK_chunks_runs_RunId",
                        column: x => x.RunId,
                        principalTable: "runs",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "run_cruises",
                columns: table => new
                {
                    RunId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Position = table.Column<int>(type: "INTEGER", nullable: false),
                    CruiseId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Name = table.Column<string>(type: "TEXT", nullable: false),
                    SamplesHash = table.Column<string>(type: "TEXT", nullable: false),
                    SampleCount = table.Column<long>(type: "INTEGER", nullable: false),
                    MeasurementSd = table.Column<string>(type: "TEXT", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_run_cruises", x => new { x.RunId, x.Position });
                    table.ForeignKey(
                        name: "FK_run_cruises_runs_RunId",
                        column: x => x.RunId,
                        principalTable: "runs",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateIndex(
                name: "IX_cruises_StudyId",
                table: "cruises",
                column: "StudyId");

            migrationBuilder.CreateIndex(
                name: "IX_runs_State",
                table: "runs",
                column: "State");

            migrationBuilder.CreateIndex(
                name: "IX_runs_StudyId",
                table: "runs",
                column: "StudyId");
        }

        /// <inheritdoc />
        protected override void Down(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.DropTable(
                name: "chunks");

            migrationBuilder.DropTable(
                name: "cruises");

            migrationBuilder.DropTable(
                name: "run_cruises");

            migrationBuilder.DropTable(
                name: "upload_files");

            migrationBuilder.DropTable(
                name: "runs");

            migrationBuilder.DropTable(
                name: "studies");
        }
    }
}
