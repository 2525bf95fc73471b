using System;
using System.Collections.Generic;
using Microsoft.EntityFrameworkCore.Migrations;

#nullable disable

namespace Plant.Register.PostgreSql.Migrations
{
    /// <inheritdoc />
    public partial class OrdersAndBench : Migration
    {
        /// <inheritdoc />
        protected override void Up(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.AddColumn<DateTime>(
                name: "DecidedAt",
                table: "work_orders",
                type: "timestamp with time zone",
                nullable: true);

            migrationBuilder.AddColumn<string>(
                name: "DecidedBy",
                table: "work_orders",
                type: "text",
                nullable: true);

            migrationBuilder.AddColumn<DateTime>(
                name: "DoneAt",
                table: "work_orders",
                type: "timestamp with time zone",
                nullable: true);

            migrationBuilder.AddColumn<string>(
                name: "DoneBy",
                table: "work_orders",
                type: "text",
                nullable: true);

            migrationBuilder.AddColumn<double>(
                name: "DrainedOilL",
                table: "work_orders",
                type: "double precision",
                nullable: true);

            migrationBuilder.AddColumn<double>(
                name: "DrainedWaterL",
                table: "work_orders",
                type: "double precision",
                nullable: true);

            migrationBuilder.AddColumn<string>(
                name: "Evidence",
                table: "work_orders",
                type: "text",
                nullable: true);

            migrationBuilder.AddColumn<double>(
                name: "ExpectedHighPpm",
                table: "work_orders",
                type: "double precision",
                nullable: true);

            migrationBuilder.AddColumn<double>(
                name: "ExpectedLowPpm",
                table: "work_orders",
                type: "double precision",
                nullable: true);

            migrationBuilder.AddColumn<string>(
                name: "Findings",
                table: "work_orders",
                type: "text",
                nullable: true);

            migrationBuilder.AddColumn<double>(
                name: "FoundPpm",
                table: "work_orders",
                type: "double precision",
                nullable: true);

            migrationBuilder.AddColumn<string>(
                name: "Note",
                table: "work_orders",
                type: "text",
                nullable: true);

            migrationBuilder.AddColumn<double>(
                name: "RunHours",
                table: "work_orders",
                type: "double precision",
                nullable: true);

            migrationBuilder.AddColumn<string>(
                name: "Separator",
                table: "work_orders",
                type: "text",
                nullable: true);

            migrationBuilder.AddColumn<DateTime>(
                name: "SubmittedAt",
                table: "work_orders",
                type: "timestamp with time zone",
                nullable: true);

            migrationBuilder.AddColumn<string>(
                name: "VerifiedBySample",
                table: "work_orders",
                type: "text",
                nullable: true);

            migrationBuilder.CreateTable(
                name: "bench_batches",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "uuid", nullable: false),
                    Owner = table.Column<string>(type: "text", nullable: false),
                    OpenedAt = table.Column<DateTime>(type: "timestamp with time zone", nullable: false),
                    ClosedAt = table.Column<DateTime>(type: "timestamp with time zone", nullable: true),
                    Method = table.Column<string>(type: "character varying(40)", maxLength: 40, nullable: false),
                    Entry = table.Column<string>(type: "character varying(40)", maxLength: 40, nullable: false),
                    Duplicates = table.Column<bool>(type: "boolean", nullable: false),
                    Instrument = table.Column<string>(type: "text", nullable: false),
                    StandardPpm = table.Column<double>(type: "double precision", nullable: true),
                    StandardFoundPpm = table.Column<double>(type: "double precision", nullable: true),
                    BlankUg = table.Column<double>(type: "double precision", nullable: true),
                    DriftUgPerMin = table.Column<double>(type: "double precision", nullable: true),
                    Minutes = table.Column<double>(type: "double precision", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_bench_batches", x => x.Id);
                });

            migrationBuilder.CreateTable(
                name: "bottles",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "uuid", nullable: false),
                    Token = table.Column<Guid>(type: "uuid", nullable: false),
                    WithdrawnAt = table.Column<DateTime>(type: "timestamp with time zone", nullable: true),
                    Code = table.Column<string>(type: "text", nullable: false),
                    ReservoirId = table.Column<Guid>(type: "uuid", nullable: false),
                    Point = table.Column<string>(type: "character varying(40)", maxLength: 40, nullable: false),
                    TakenAt = table.Column<DateTime>(type: "timestamp with time zone", nullable: false),
                    OilTemperatureC = table.Column<double>(type: "double precision", nullable: true),
                    TakenBy = table.Column<string>(type: "text", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_bottles", x => x.Id);
                    table.ForeignKey(
                        name: "FK_bottles_reservoirs_ReservoirId",
                        column: x => x.ReservoirId,
                        principalTable: "reservoirs",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "order_looks",
                columns: table => new
                {
                    OrderId = table.Column<Guid>(type: "uuid", nullable: false),
                    Person = table.Column<string>(type: "text", nullable: false),
                    At = table.Column<DateTime>(type: "timestamp with time zone", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_order_looks", x => new { x.OrderId, x.Person });
                });

            migrationBuilder.CreateTable(
                name: "bench_rows",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "uuid", nullable: false),
                    BatchId = table.Column<Guid>(type: "uuid", nullable: false),
                    Ordinal = table.Column<int>(type: "integer", nullable: false),
                    Bottle = table.Column<string>(type: "text", nullable: false),
                    ReservoirId = table.Column<Guid>(type: "uuid", nullable: false),
                    Tag = table.Column<string>(type: "text", nullable: false),
                    Point = table.Column<string>(type: "character varying(40)", maxLength: 40, nullable: false),
                    TakenAt = table.Column<DateTime>(type: "timestamp with time zone", nullable: false),
                    OilTemperatureC = table.Column<double>(type: "double precision", nullable: true),
                    ExpectedLowPpm = table.Column<double>(type: "double precision", nullable: true),
                    ExpectedHighPpm = table.Column<double>(type: "double precision", nullable: true),
                    SaturationPpm = table.Column<double>(type: "double precision", nullable: true),
                    Cells = table.Column<List<string>>(type: "text[]", nullable: false),
                    SetAside = table.Column<bool>(type: "boolean", nullable: false),
                    SavedAt = table.Column<DateTime>(type: "timestamp with time zone", nullable: false),
                    ReleasedAt = table.Column<DateTime>(type: "timestamp with time zone", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_bench_rows", x => x.Id);
                    table.ForeignKey(
                        name: "FK_bench_rows_bench_batches_BatchId",
                        column: x => x.BatchId,
                        principalTable: "bench_batches",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateIndex(
                name: "IX_bench_batches_Owner_OpenedAt",
                table: "bench_batches",
                columns: new[] { "Owner", "OpenedAt" });

            migrationBuilder.CreateIndex(
                name: "IX_bench_rows_BatchId",
                table: "bench_rows",
                column: "BatchId");

            migrationBuilder.CreateIndex(
                name: "IX_bench_rows_Bottle",
                table: "bench_rows",
                column: "Bottle");

            migrationBuilder.CreateIndex(
                name: "IX_bottles_Code",
                table: "bottles",
                column: "Code",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_bottles_ReservoirId",
                table: "bottles",
                column: "ReservoirId");
        }

        /// <inheritdoc />
        protected override void Down(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.DropTable(
                name: "bench_rows");

            migrationBuilder.DropTable(
                name: "bottles");

            migrationBuilder.DropTable(
                name: "order_looks");

            migrationBuilder.DropTable(
                name: "bench_batches");

            migrationBuilder.DropColumn(
                name: "DecidedAt",
                table: "work_orders");

            migrationBuilder.DropColumn(
                name: "DecidedBy",
                table: "work_orders");

            migrationBuilder.DropColumn(
                name: "DoneAt",
                table: "work_orders");

            migrationBuilder.DropColumn(
                name: "DoneBy",
                table: "work_orders");

            migrationBuilder.DropColumn(
                name: "DrainedOilL",
                table: "work_orders");

            migrationBuilder.DropColumn(
                name: "DrainedWaterL",
                table: "work_orders");

            migrationBuilder.DropColumn(
                name: "Evidence",
                table: "work_orders");

            migrationBuilder.DropColumn(
                name: "ExpectedHighPpm",
                table: "work_orders");

            migrationBuilder.DropColumn(
                name: "ExpectedLowPpm",
                table: "work_orders");

            migrationBuilder.DropColumn(
                name: "Findings",
                table: "work_orders");

            migrationBuilder.DropColumn(
                name: "FoundPpm",
                table: "work_orders");

            migrationBuilder.DropColumn(
                name: "Note",
                table: "work_orders");

            migrationBuilder.DropColumn(
                name: "RunHours",
                table: "work_orders");

            migrationBuilder.DropColumn(
                name: "Separator",
                table: "work_orders");

            migrationBuilder.DropColumn(
                name: "SubmittedAt",
                table: "work_orders");

            migrationBuilder.DropColumn(
                name: "VerifiedBySample",
                table: "work_orders");
        }
    }
}
