using System;
using Microsoft.EntityFrameworkCore.Migrations;

#nullable disable

namespace Plant.Register.Sqlite.Migrations
{
    /// <inheritdoc />
    public partial class Initial : Migration
    {
        /// <inheritdoc />
        protected override void Up(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.CreateTable(
                name: "api_tokens",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    Name = table.Column<string>(type: "TEXT", nullable: false),
                    Role = table.Column<string>(type: "TEXT", nullable: false),
                    Hash = table.Column<string>(type: "TEXT", nullable: false),
                    CreatedAt = table.Column<long>(type: "INTEGER", nullable: false),
                    ExpiresAt = table.Column<long>(type: "INTEGER", nullable: true),
                    RevokedAt = table.Column<long>(type: "INTEGER", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_api_tokens", x => x.Id);
                });

            migrationBuilder.CreateTable(
                name: "AspNetRoles",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    Name = table.Column<string>(type: "TEXT", maxLength: 256, nullable: true),
                    NormalizedName = table.Column<string>(type: "TEXT", maxLength: 256, nullable: true),
                    ConcurrencyStamp = table.Column<string>(type: "TEXT", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_AspNetRoles", x => x.Id);
                });

            migrationBuilder.CreateTable(
                name: "AspNetUsers",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    DisplayName = table.Column<string>(type: "TEXT", nullable: true),
                    Disabled = table.Column<bool>(type: "INTEGER", nullable: false),
                    MustChangePassword = table.Column<bool>(type: "INTEGER", nullable: false),
                    UserName = table.Column<string>(type: "TEXT", maxLength: 256, nullable: true),
                    NormalizedUserName = table.Column<string>(type: "TEXT", maxLength: 256, nullable: true),
                    Email = table.Column<string>(type: "TEXT", maxLength: 256, nullable: true),
                    NormalizedEmail = table.Column<string>(type: "TEXT", maxLength: 256, nullable: true),
                    EmailConfirmed = table.Column<bool>(type: "INTEGER", nullable: false),
                    PasswordHash = table.Column<string>(type: "TEXT", nullable: true),
                    SecurityStamp = table.Column<string>(type: "TEXT", nullable: true),
                    ConcurrencyStamp = table.Column<string>(type: "TEXT", nullable: true),
                    PhoneNumber = table.Column<string>(type: "TEXT", maxLength: 256, nullable: true),
                    PhoneNumberConfirmed = table.Column<bool>(type: "INTEGER", nullable: false),
                    TwoFactorEnabled = table.Column<bool>(type: "INTEGER", nullable: false),
                    LockoutEnd = table.Column<DateTimeOffset>(type: "TEXT", nullable: true),
                    LockoutEnabled = table.Column<bool>(type: "INTEGER", nullable: false),
                    AccessFailedCount = table.Column<int>(type: "INTEGER", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_AspNetUsers", x => x.Id);
                });

            migrationBuilder.CreateTable(
                name: "audit_entries",
                columns: table => new
                {
                    Sequence = table.Column<long>(type: "INTEGER", nullable: false),
                    At = table.Column<long>(type: "INTEGER", nullable: false),
                    Actor = table.Column<string>(type: "TEXT", nullable: false),
                    Action = table.Column<string>(type: "TEXT", nullable: false),
                    Kind = table.Column<string>(type: "TEXT", nullable: false),
                    RecordId = table.Column<Guid>(type: "TEXT", nullable: true),
                    Key = table.Column<string>(type: "TEXT", nullable: false),
                    Reason = table.Column<string>(type: "TEXT", nullable: true),
                    Detail = table.Column<string>(type: "TEXT", nullable: false),
                    ContentSum = table.Column<string>(type: "TEXT", nullable: false),
                    PreviousHash = table.Column<string>(type: "TEXT", nullable: false),
                    Hash = table.Column<string>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_audit_entries", x => x.Sequence);
                });

            migrationBuilder.CreateTable(
                name: "audit_heads",
                columns: table => new
                {
                    Kind = table.Column<string>(type: "TEXT", nullable: false),
                    Count = table.Column<long>(type: "INTEGER", nullable: false),
                    Sum = table.Column<string>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_audit_heads", x => x.Kind);
                });

            migrationBuilder.CreateTable(
                name: "fluids",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    Token = table.Column<Guid>(type: "TEXT", nullable: false),
                    WithdrawnAt = table.Column<long>(type: "INTEGER", nullable: true),
                    Code = table.Column<string>(type: "TEXT", nullable: false),
                    Name = table.Column<string>(type: "TEXT", nullable: false),
                    Family = table.Column<string>(type: "TEXT", maxLength: 40, nullable: false),
                    IsoVg = table.Column<double>(type: "REAL", nullable: true),
                    Viscosity40Mm2S = table.Column<double>(type: "REAL", nullable: true),
                    Viscosity100Mm2S = table.Column<double>(type: "REAL", nullable: true),
                    Density15KgM3 = table.Column<double>(type: "REAL", nullable: true),
                    ExpansionPerK = table.Column<double>(type: "REAL", nullable: true),
                    SolubilityA = table.Column<double>(type: "REAL", nullable: true),
                    SolubilityB = table.Column<double>(type: "REAL", nullable: true),
                    InterfacialTensionMNM = table.Column<double>(type: "REAL", nullable: true),
                    RelativePermittivity = table.Column<double>(type: "REAL", nullable: true),
                    ConductivityPSM = table.Column<double>(type: "REAL", nullable: true),
                    DemulsibilityMin = table.Column<double>(type: "REAL", nullable: true),
                    WaterLimitPpm = table.Column<double>(type: "REAL", nullable: true),
                    ViscosityOrigin = table.Column<string>(type: "TEXT", maxLength: 40, nullable: false),
                    DensityOrigin = table.Column<string>(type: "TEXT", maxLength: 40, nullable: false),
                    SolubilityOrigin = table.Column<string>(type: "TEXT", maxLength: 40, nullable: false),
                    LimitOrigin = table.Column<string>(type: "TEXT", maxLength: 40, nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_fluids", x => x.Id);
                });

            // clustered by its key: a range of one series is one run of pages
            migrationBuilder.Sql("""
                CREATE TABLE "readings" (
                    "SeriesNumber" INTEGER NOT NULL,
                    "AtMs" INTEGER NOT NULL,
                    "OilTemperatureC" REAL NULL,
                    "WaterActivity" REAL NULL,
                    CONSTRAINT "PK_readings" PRIMARY KEY ("SeriesNumber", "AtMs")
                ) WITHOUT ROWID;
                """);

            migrationBuilder.CreateTable(
                name: "revisions",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    Kind = table.Column<string>(type: "TEXT", nullable: false),
                    RecordId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Number = table.Column<int>(type: "INTEGER", nullable: false),
                    Content = table.Column<string>(type: "TEXT", nullable: false),
                    ReplacedAt = table.Column<long>(type: "INTEGER", nullable: false),
                    ReplacedBy = table.Column<string>(type: "TEXT", nullable: false),
                    Reason = table.Column<string>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_revisions", x => x.Id);
                });

            migrationBuilder.CreateTable(
                name: "rounds",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    Token = table.Column<Guid>(type: "TEXT", nullable: false),
                    WithdrawnAt = table.Column<long>(type: "INTEGER", nullable: true),
                    Code = table.Column<string>(type: "TEXT", nullable: false),
                    Name = table.Column<string>(type: "TEXT", nullable: false),
                    PlannedFor = table.Column<DateOnly>(type: "TEXT", nullable: false),
                    Tags = table.Column<string>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_rounds", x => x.Id);
                });

            migrationBuilder.CreateTable(
                name: "sites",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    Name = table.Column<string>(type: "TEXT", nullable: false),
                    TimeZone = table.Column<string>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_sites", x => x.Id);
                });

            migrationBuilder.CreateTable(
                name: "AspNetRoleClaims",
                columns: table => new
                {
                    Id = table.Column<int>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    RoleId = table.Column<Guid>(type: "TEXT", nullable: false),
                    ClaimType = table.Column<string>(type: "TEXT", nullable: true),
                    ClaimValue = table.Column<string>(type: "TEXT", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_AspNetRoleClaims", x => x.Id);
                    table.ForeignKey(
                        name: "FK_AspNetRoleClaims_AspNetRoles_RoleId",
                        column: x => x.RoleId,
                        principalTable: "AspNetRoles",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "AspNetUserClaims",
                columns: table => new
                {
                    Id = table.Column<int>(type: "INTEGER", nullable: false)
                        .Annotation("Sqlite:Autoincrement", true),
                    UserId = table.Column<Guid>(type: "TEXT", nullable: false),
                    ClaimType = table.Column<string>(type: "TEXT", nullable: true),
                    ClaimValue = table.Column<string>(type: "TEXT", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_AspNetUserClaims", x => x.Id);
                    table.ForeignKey(
                        name: "FK_AspNetUserClaims_AspNetUsers_UserId",
                        column: x => x.UserId,
                        principalTable: "AspNetUsers",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "AspNetUserLogins",
                columns: table => new
                {
                    LoginProvider = table.Column<string>(type: "TEXT", maxLength: 128, nullable: false),
                    ProviderKey = table.Column<string>(type: "TEXT", maxLength: 128, nullable: false),
                    ProviderDisplayName = table.Column<string>(type: "TEXT", nullable: true),
                    UserId = table.Column<Guid>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_AspNetUserLogins", x => new { x.LoginProvider, x.ProviderKey });
                    table.ForeignKey(
                        name: "FK_AspNetUserLogins_AspNetUsers_UserId",
                        column: x => x.UserId,
                        principalTable: "AspNetUsers",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "AspNetUserPasskeys",
                columns: table => new
                {
                    CredentialId = table.Column<byte[]>(type: "BLOB", maxLength: 1024, nullable: false),
                    UserId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Data = table.Column<string>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_AspNetUserPasskeys", x => x.CredentialId);
                    table.ForeignKey(
                        name: "FK_AspNetUserPasskeys_AspNetUsers_UserId",
                        column: x => x.UserId,
                        principalTable: "AspNetUsers",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "AspNetUserRoles",
                columns: table => new
                {
                    UserId = table.Column<Guid>(type: "TEXT", nullable: false),
                    RoleId = table.Column<Guid>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_AspNetUserRoles", x => new { x.UserId, x.RoleId });
                    table.ForeignKey(
                        name: "FK_AspNetUserRoles_AspNetRoles_RoleId",
                        column: x => x.RoleId,
                        principalTable: "AspNetRoles",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                    table.ForeignKey(
                        name: "FK_AspNetUserRoles_AspNetUsers_UserId",
                        column: x => x.UserId,
                        principalTable: "AspNetUsers",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "AspNetUserTokens",
                columns: table => new
                {
                    UserId = table.Column<Guid>(type: "TEXT", nullable: false),
                    LoginProvider = table.Column<string>(type: "TEXT", maxLength: 128, nullable: false),
                    Name = table.Column<string>(type: "TEXT", maxLength: 128, nullable: false),
                    Value = table.Column<string>(type: "TEXT", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_AspNetUserTokens", x => new { x.UserId, x.LoginProvider, x.Name });
                    table.ForeignKey(
                        name: "FK_AspNetUserTokens_AspNetUsers_UserId",
                        column: x => x.UserId,
                        principalTable: "AspNetUsers",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Cascade);
                });

            migrationBuilder.CreateTable(
                name: "areas",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    SiteId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Name = table.Column<string>(type: "TEXT", nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_areas", x => x.Id);
                    table.ForeignKey(
                        name: "FK_areas_sites_SiteId",
                        column: x => x.SiteId,
                        principalTable: "sites",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "reservoirs",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    Token = table.Column<Guid>(type: "TEXT", nullable: false),
                    WithdrawnAt = table.Column<long>(type: "INTEGER", nullable: true),
                    SeriesNumber = table.Column<int>(type: "INTEGER", nullable: false),
                    Tag = table.Column<string>(type: "TEXT", nullable: false),
                    Name = table.Column<string>(type: "TEXT", nullable: false),
                    AreaId = table.Column<Guid>(type: "TEXT", nullable: true),
                    Service = table.Column<string>(type: "TEXT", nullable: true),
                    FluidId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Shape = table.Column<string>(type: "TEXT", maxLength: 40, nullable: true),
                    LengthMm = table.Column<double>(type: "REAL", nullable: true),
                    WidthMm = table.Column<double>(type: "REAL", nullable: true),
                    HeightMm = table.Column<double>(type: "REAL", nullable: true),
                    OilVolumeL = table.Column<double>(type: "REAL", nullable: true),
                    SuctionHeightMm = table.Column<double>(type: "REAL", nullable: true),
                    CirculationLPerMin = table.Column<double>(type: "REAL", nullable: true),
                    OperatingTemperatureC = table.Column<double>(type: "REAL", nullable: true),
                    ColdestTemperatureC = table.Column<double>(type: "REAL", nullable: true),
                    HeadspaceRhPercent = table.Column<double>(type: "REAL", nullable: true),
                    Breather = table.Column<string>(type: "TEXT", maxLength: 40, nullable: true),
                    WaterLimitPpm = table.Column<double>(type: "REAL", nullable: true),
                    WaterCapacityL = table.Column<double>(type: "REAL", nullable: true),
                    Criticality = table.Column<int>(type: "INTEGER", nullable: true),
                    CommissionedAt = table.Column<long>(type: "INTEGER", nullable: true),
                    DimensionsOrigin = table.Column<string>(type: "TEXT", maxLength: 40, nullable: false),
                    TemperaturesOrigin = table.Column<string>(type: "TEXT", maxLength: 40, nullable: false),
                    LimitOrigin = table.Column<string>(type: "TEXT", maxLength: 40, nullable: false),
                    CapacityOrigin = table.Column<string>(type: "TEXT", maxLength: 40, nullable: false)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_reservoirs", x => x.Id);
                    table.ForeignKey(
                        name: "FK_reservoirs_areas_AreaId",
                        column: x => x.AreaId,
                        principalTable: "areas",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_reservoirs_fluids_FluidId",
                        column: x => x.FluidId,
                        principalTable: "fluids",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "drains",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    Token = table.Column<Guid>(type: "TEXT", nullable: false),
                    WithdrawnAt = table.Column<long>(type: "INTEGER", nullable: true),
                    ReservoirId = table.Column<Guid>(type: "TEXT", nullable: false),
                    DrainedAt = table.Column<long>(type: "INTEGER", nullable: false),
                    WaterL = table.Column<double>(type: "REAL", nullable: false),
                    OilL = table.Column<double>(type: "REAL", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_drains", x => x.Id);
                    table.ForeignKey(
                        name: "FK_drains_reservoirs_ReservoirId",
                        column: x => x.ReservoirId,
                        principalTable: "reservoirs",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "samples",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    Token = table.Column<Guid>(type: "TEXT", nullable: false),
                    WithdrawnAt = table.Column<long>(type: "INTEGER", nullable: true),
                    Code = table.Column<string>(type: "TEXT", nullable: false),
                    Replicate = table.Column<int>(type: "INTEGER", nullable: false),
                    ReservoirId = table.Column<Guid>(type: "TEXT", nullable: false),
                    TakenAt = table.Column<long>(type: "INTEGER", nullable: false),
                    ReceivedAt = table.Column<long>(type: "INTEGER", nullable: true),
                    Point = table.Column<string>(type: "TEXT", maxLength: 40, nullable: false),
                    OilTemperatureC = table.Column<double>(type: "REAL", nullable: true),
                    Method = table.Column<string>(type: "TEXT", maxLength: 40, nullable: false),
                    WaterPpm = table.Column<double>(type: "REAL", nullable: true),
                    WaterActivity = table.Column<double>(type: "REAL", nullable: true),
                    Analyst = table.Column<string>(type: "TEXT", nullable: true),
                    Remark = table.Column<string>(type: "TEXT", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_samples", x => x.Id);
                    table.ForeignKey(
                        name: "FK_samples_reservoirs_ReservoirId",
                        column: x => x.ReservoirId,
                        principalTable: "reservoirs",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "separators",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    Token = table.Column<Guid>(type: "TEXT", nullable: false),
                    WithdrawnAt = table.Column<long>(type: "INTEGER", nullable: true),
                    Code = table.Column<string>(type: "TEXT", nullable: false),
                    ReservoirId = table.Column<Guid>(type: "TEXT", nullable: true),
                    Kind = table.Column<string>(type: "TEXT", maxLength: 40, nullable: false),
                    FlowLPerMin = table.Column<double>(type: "REAL", nullable: true),
                    Efficiency = table.Column<double>(type: "REAL", nullable: true),
                    CutSizeUm = table.Column<double>(type: "REAL", nullable: true),
                    PressureKPa = table.Column<double>(type: "REAL", nullable: true),
                    OilTemperatureC = table.Column<double>(type: "REAL", nullable: true),
                    CapacityL = table.Column<double>(type: "REAL", nullable: true),
                    Portable = table.Column<bool>(type: "INTEGER", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_separators", x => x.Id);
                    table.ForeignKey(
                        name: "FK_separators_reservoirs_ReservoirId",
                        column: x => x.ReservoirId,
                        principalTable: "reservoirs",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "topups",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    Token = table.Column<Guid>(type: "TEXT", nullable: false),
                    WithdrawnAt = table.Column<long>(type: "INTEGER", nullable: true),
                    ReservoirId = table.Column<Guid>(type: "TEXT", nullable: false),
                    AddedAt = table.Column<long>(type: "INTEGER", nullable: false),
                    OilL = table.Column<double>(type: "REAL", nullable: false),
                    WaterPpm = table.Column<double>(type: "REAL", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_topups", x => x.Id);
                    table.ForeignKey(
                        name: "FK_topups_reservoirs_ReservoirId",
                        column: x => x.ReservoirId,
                        principalTable: "reservoirs",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "work_orders",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    Token = table.Column<Guid>(type: "TEXT", nullable: false),
                    WithdrawnAt = table.Column<long>(type: "INTEGER", nullable: true),
                    Number = table.Column<string>(type: "TEXT", nullable: false),
                    ReservoirId = table.Column<Guid>(type: "TEXT", nullable: false),
                    Kind = table.Column<string>(type: "TEXT", maxLength: 40, nullable: false),
                    State = table.Column<string>(type: "TEXT", maxLength: 40, nullable: false),
                    Task = table.Column<string>(type: "TEXT", nullable: false),
                    Reason = table.Column<string>(type: "TEXT", nullable: false),
                    Author = table.Column<string>(type: "TEXT", nullable: false),
                    CreatedAt = table.Column<long>(type: "INTEGER", nullable: false),
                    DueAt = table.Column<long>(type: "INTEGER", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_work_orders", x => x.Id);
                    table.ForeignKey(
                        name: "FK_work_orders_reservoirs_ReservoirId",
                        column: x => x.ReservoirId,
                        principalTable: "reservoirs",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateTable(
                name: "separator_runs",
                columns: table => new
                {
                    Id = table.Column<Guid>(type: "TEXT", nullable: false),
                    Token = table.Column<Guid>(type: "TEXT", nullable: false),
                    WithdrawnAt = table.Column<long>(type: "INTEGER", nullable: true),
                    SeparatorId = table.Column<Guid>(type: "TEXT", nullable: false),
                    ReservoirId = table.Column<Guid>(type: "TEXT", nullable: false),
                    StartedAt = table.Column<long>(type: "INTEGER", nullable: false),
                    EndedAt = table.Column<long>(type: "INTEGER", nullable: true)
                },
                constraints: table =>
                {
                    table.PrimaryKey("PK_separator_runs", x => x.Id);
                    table.ForeignKey(
                        name: "FK_separator_runs_reservoirs_ReservoirId",
                        column: x => x.ReservoirId,
                        principalTable: "reservoirs",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                    table.ForeignKey(
                        name: "FK_separator_runs_separators_SeparatorId",
                        column: x => x.SeparatorId,
                        principalTable: "separators",
                        principalColumn: "Id",
                        onDelete: ReferentialAction.Restrict);
                });

            migrationBuilder.CreateIndex(
                name: "IX_api_tokens_Hash",
                table: "api_tokens",
                column: "Hash",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_areas_SiteId_Name",
                table: "areas",
                columns: new[] { "SiteId", "Name" },
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_AspNetRoleClaims_RoleId",
                table: "AspNetRoleClaims",
                column: "RoleId");

            migrationBuilder.CreateIndex(
                name: "RoleNameIndex",
                table: "AspNetRoles",
                column: "NormalizedName",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_AspNetUserClaims_UserId",
                table: "AspNetUserClaims",
                column: "UserId");

            migrationBuilder.CreateIndex(
                name: "IX_AspNetUserLogins_UserId",
                table: "AspNetUserLogins",
                column: "UserId");

            migrationBuilder.CreateIndex(
                name: "IX_AspNetUserPasskeys_UserId",
                table: "AspNetUserPasskeys",
                column: "UserId");

            migrationBuilder.CreateIndex(
                name: "IX_AspNetUserRoles_RoleId",
                table: "AspNetUserRoles",
                column: "RoleId");

            migrationBuilder.CreateIndex(
                name: "EmailIndex",
                table: "AspNetUsers",
                column: "NormalizedEmail");

            migrationBuilder.CreateIndex(
                name: "UserNameIndex",
                table: "AspNetUsers",
                column: "NormalizedUserName",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_audit_entries_Kind_RecordId",
                table: "audit_entries",
                columns: new[] { "Kind", "RecordId" });

            migrationBuilder.CreateIndex(
                name: "IX_drains_ReservoirId_DrainedAt",
                table: "drains",
                columns: new[] { "ReservoirId", "DrainedAt" },
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_fluids_Code",
                table: "fluids",
                column: "Code",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_reservoirs_AreaId",
                table: "reservoirs",
                column: "AreaId");

            migrationBuilder.CreateIndex(
                name: "IX_reservoirs_FluidId",
                table: "reservoirs",
                column: "FluidId");

            migrationBuilder.CreateIndex(
                name: "IX_reservoirs_SeriesNumber",
                table: "reservoirs",
                column: "SeriesNumber",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_reservoirs_Tag",
                table: "reservoirs",
                column: "Tag",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_revisions_RecordId_Number",
                table: "revisions",
                columns: new[] { "RecordId", "Number" },
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_rounds_Code",
                table: "rounds",
                column: "Code",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_samples_Code_Replicate",
                table: "samples",
                columns: new[] { "Code", "Replicate" },
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_samples_ReservoirId_TakenAt",
                table: "samples",
                columns: new[] { "ReservoirId", "TakenAt" });

            migrationBuilder.CreateIndex(
                name: "IX_separator_runs_ReservoirId_StartedAt",
                table: "separator_runs",
                columns: new[] { "ReservoirId", "StartedAt" });

            migrationBuilder.CreateIndex(
                name: "IX_separator_runs_SeparatorId_StartedAt",
                table: "separator_runs",
                columns: new[] { "SeparatorId", "StartedAt" },
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_separators_Code",
                table: "separators",
                column: "Code",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_separators_ReservoirId",
                table: "separators",
                column: "ReservoirId");

            migrationBuilder.CreateIndex(
                name: "IX_topups_ReservoirId_AddedAt",
                table: "topups",
                columns: new[] { "ReservoirId", "AddedAt" },
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_work_orders_Number",
                table: "work_orders",
                column: "Number",
                unique: true);

            migrationBuilder.CreateIndex(
                name: "IX_work_orders_ReservoirId",
                table: "work_orders",
                column: "ReservoirId");
        }

        /// <inheritdoc />
        protected override void Down(MigrationBuilder migrationBuilder)
        {
            migrationBuilder.DropTable(
                name: "api_tokens");

            migrationBuilder.DropTable(
                name: "AspNetRoleClaims");

            migrationBuilder.DropTable(
                name: "AspNetUserClaims");

            migrationBuilder.DropTable(
                name: "AspNetUserLogins");

            migrationBuilder.DropTable(
                name: "AspNetUserPasskeys");

            migrationBuilder.DropTable(
                name: "AspNetUserRoles");

            migrationBuilder.DropTable(
                name: "AspNetUserTokens");

            migrationBuilder.DropTable(
                name: "audit_entries");

            migrationBuilder.DropTable(
                name: "audit_heads");

            migrationBuilder.DropTable(
                name: "drains");

            migrationBuilder.DropTable(
                name: "readings");

            migrationBuilder.DropTable(
                name: "revisions");

            migrationBuilder.DropTable(
                name: "rounds");

            migrationBuilder.DropTable(
                name: "samples");

            migrationBuilder.DropTable(
                name: "separator_runs");

            migrationBuilder.DropTable(
                name: "topups");

            migrationBuilder.DropTable(
                name: "work_orders");

            migrationBuilder.DropTable(
                name: "AspNetRoles");

            migrationBuilder.DropTable(
                name: "AspNetUsers");

            migrationBuilder.DropTable(
                name: "separators");

            migrationBuilder.DropTable(
                name: "reservoirs");

            migrationBuilder.DropTable(
                name: "areas");

            migrationBuilder.DropTable(
                name: "fluids");

            migrationBuilder.DropTable(
                name: "sites");
        }
    }
}
